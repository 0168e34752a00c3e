import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { buildPersonLines, buildRosterModel, hasLine, type PersonLines } from '@/modules/model';
import { type Problem, type ProblemPerson, rulesOf } from '@/modules/problem';
import { type ProvenPerson, proveRoster } from '@/modules/proof';
import { buildProblem, houseKinds, type ProblemSketch } from '@/tests/support/problem-builder';
import { smallProblem } from '@/tests/support/random-problems';
import { anyPerson, anyRules, anyShare, anyStart, worldKinds } from '../../proof/small-worlds';
import { endOf, everyLine, rosterOf } from './every-line';

/*
 * The nets against the proof, which shares no code with them: every choice of shifts that one person can
 * make is held against both.
 */

/** How many lines of the person are lawful; the net must have those and no others. */
function compareLines(problem: Problem, lines: PersonLines): number {
  const { person } = lines;
  const alone = { ...problem, people: [person], floors: [], ceilings: [], teamRules: [] };
  let lawful = 0;
  for (const line of everyLine(problem)) {
    const proof = proveRoster(alone, rosterOf(problem, person, line));
    const isLawful = proof.breaches.length === 0;
    const end = endOf(lines, line);
    if (end >= 0 !== isLawful) expect({ line, inNet: end >= 0 }).toEqual({ line, inNet: isLawful });
    if (!isLawful) continue;
    lawful += 1;
    const [counts] = proof.people;
    if (counts) compareCounts(problem, person, lines, end, counts);
  }
  return lawful;
}

/** An end knows what its lines have worked: minutes always, Nights and weekends where something asks. */
function compareCounts(
  problem: Problem,
  person: ProblemPerson,
  { net: { ends } }: PersonLines,
  end: number,
  { workedMinutes, nights, weekends }: ProvenPerson,
) {
  const rules = rulesOf(problem, person);
  const isPriced = (measure: string) => problem.fairness.some((term) => term.measure === measure);
  const worked = [
    workedMinutes,
    rules.nightsPerPeriod !== null || isPriced('nights') ? nights : 0,
    rules.weekendsPerPeriod !== null || isPriced('weekends') ? weekends : 0,
  ];
  const known = [ends.minutes[end], ends.nights[end], ends.weekends[end]];
  // A plain comparison first: `expect` is slow, and there are millions of lines.
  if (known.some((count, index) => count !== worked[index])) expect(known).toEqual(worked);
}

const linesOf = (problem: Problem): PersonLines[] =>
  buildPersonLines(problem, buildRosterModel(problem).works);

const compareAll = (problem: Problem): number =>
  linesOf(problem).reduce((sum, lines) => sum + compareLines(problem, lines), 0);

/** Holds nets against the proof on random problems; some lines of theirs must be lawful. */
function compareAny(problems: fc.Arbitrary<Problem>, numRuns: number) {
  let lawful = 0;
  const compare = (problem: Problem) => {
    lawful += compareAll(problem);
  };
  fc.assert(fc.property(problems, compare), { numRuns });
  expect(lawful).toBeGreaterThan(1000);
}

const early = (dayIndex: number) => ({
  dayIndex,
  startMinute: dayIndex * 1440 + 420,
  endMinute: dayIndex * 1440 + 900,
  isNight: false,
});
const night = (dayIndex: number) => ({
  dayIndex,
  startMinute: dayIndex * 1440 + 1380,
  endMinute: dayIndex * 1440 + 1860,
  isNight: true,
});

/** Problems of one person and four days or a week; each has the number of lawful lines beside it, counted by hand. */
const byHand: readonly (readonly [string, ProblemSketch, number])[] = [
  ['one kind and no rule', { kinds: houseKinds.slice(0, 1) }, 16],
  ['at most two in a row', { kinds: houseKinds.slice(0, 1), rules: { longestRunDays: 2 } }, 13],
  [
    'at most two in a row, and two before',
    {
      kinds: houseKinds.slice(0, 1),
      rules: { longestRunDays: 2 },
      people: [{ history: [early(-2), early(-1)] }],
    },
    7,
  ],
  [
    'at most one in a row, and two after that no line can change',
    {
      kinds: houseKinds.slice(0, 1),
      rules: { longestRunDays: 1 },
      people: [{ following: [early(4), early(5)] }],
    },
    5,
  ],
  [
    'one Night in a row, and two after that no line can change',
    {
      kinds: houseKinds.slice(3),
      rules: { longestRunNights: 1 },
      people: [{ following: [night(4), night(5)] }],
    },
    5,
  ],
  [
    'one weekend of one, both of its days',
    { kinds: houseKinds.slice(0, 1), rules: { weekendsPerPeriod: 1 }, dayCount: 7 },
    128,
  ],
  [
    'one weekend of two, from a Sunday to a Saturday',
    {
      startsOn: '2027-01-31',
      dayCount: 7,
      kinds: houseKinds.slice(0, 1),
      rules: { weekendsPerPeriod: 1 },
    },
    96,
  ],
];

describe('a net has the lines that break no rule, and no others', () => {
  it.each(byHand)('%s', (_, sketch, count) => {
    expect(compareAll(buildProblem({ dayCount: 4, ...sketch }))).toBe(count);
  });

  it('with rules of all kinds, limits of a person and shifts before and after', () => {
    compareAny(smallProblem, 40);
  });

  it('over a week with pins, leave, least hours and a clock change', () => {
    const person = fc.tuple(anyPerson(7));
    const week = fc
      .record({ people: person, rules: anyRules, fairness: anyShare, startsOn: anyStart })
      .map((sketch) =>
        buildProblem({ ...sketch, zone: 'Europe/Berlin', dayCount: 7, kinds: worldKinds }),
      );
    compareAny(week, 30);
  });

  it('with kinds that are not offered every day, and long ones that need days of rest', () => {
    const long = { id: 'Long', startMinute: 480, endMinute: 480 + 30 * 60 };
    const short = { id: 'Short', startMinute: 600, endMinute: 840 };
    const problems = fc
      .record({
        rules: anyRules,
        people: fc.tuple(anyPerson(5)),
        left: fc.array(fc.nat(19), { maxLength: 8 }),
      })
      .map(({ left, ...sketch }) => {
        const full = buildProblem({ ...sketch, dayCount: 5, kinds: [...worldKinds, long, short] });
        const people = full.people.map((person) => ({ ...person, pins: [], wishes: [] }));
        const shifts = full.shifts.filter(({ index }) => !left.includes(index));
        return { ...full, people, shifts: shifts.map((shift, index) => ({ ...shift, index })) };
      });
    compareAny(problems, 30);
  });

  it('with limits of kinds too large to be counted in the net', () => {
    const kindLimits = ['Early', 'Late', 'Night'].map((kindId) => ({ kindId, most: 3 }));
    const kinds = houseKinds.filter(({ id }) => id !== 'Day');
    const problem = buildProblem({ dayCount: 6, kinds, people: [{ kindLimits }] });
    expect(linesOf(problem)[0]?.sideLimits.length).toBeGreaterThan(0);
    expect(compareAll(problem)).toBeGreaterThan(100);
  });
});

describe('people and their nets', () => {
  const nets = (...people: Partial<ProblemPerson>[]) =>
    linesOf(buildProblem({ people })).map(({ net }) => net);

  it('share one when their rules are equal, whatever their pay, pins and leave', () => {
    const leave = [{ startMinute: 0, endMinute: 1440, reason: 'leave' }];
    const pins = [{ dayIndex: 1, shiftIndex: 4, postSkillId: null }];
    const [one, other] = nets({}, { payCentsPerHour: 9000, absences: leave, pins });
    expect(other).toBe(one);
  });

  it.each<[string, Partial<ProblemPerson>]>([
    ['hours', { maximumMinutes: 960 }],
    ['shifts before the period', { history: [night(-1)] }],
    ['a limit of a kind', { kindLimits: [{ kindId: 'Night', most: 1 }] }],
    ['Nights', { mayWorkNights: false }],
  ])('have different ones when they differ in %s', (_, person) => {
    const [one, other] = nets({}, person);
    expect(other).not.toBe(one);
  });

  it('join kinds that no rule tells apart, and those alone', () => {
    // Early and Day are equally long and leave equally many choices; Late and Night do not.
    const [lines] = linesOf(buildProblem());
    expect(lines?.net.groupCount).toBe(1 + 3);
    const limited = { kindLimits: [{ kindId: 'Day', most: 1 }] };
    const [other] = linesOf(buildProblem({ people: [limited] }));
    expect(other?.net.groupCount).toBe(1 + 4);
  });

  it('have none at all when no line is lawful', () => {
    const [net] = nets({ minimumMinutes: 10_000 });
    expect(net && hasLine(net)).toBe(false);
  });
});
