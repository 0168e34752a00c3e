import { describe, expect, it } from 'vitest';
import { assembleProblem, type ProblemParts, problemSchema } from '@/modules/problem';
import { proveRoster } from '@/modules/proof';
import { floorOf, kindOf, nightKind, partsOf, personOf, vet } from '@/tests/support/problem-parts';

const problemOf = (parts: Partial<ProblemParts> = {}) => assembleProblem(partsOf(parts)).problem;

describe('a problem of one week', () => {
  it('is a valid document with a day, shift and floor for each date', () => {
    const { problem, notes } = assembleProblem(partsOf());
    expect(problemSchema.parse(problem)).toEqual(problem);
    expect(notes).toEqual([]);
    expect(problem.days.map(({ startMinute }) => startMinute)).toEqual(
      [0, 1, 2, 3, 4, 5, 6].map((day) => day * 1440),
    );
    expect(problem.shifts.map(({ index, dayIndex }) => [index, dayIndex])).toEqual(
      [0, 1, 2, 3, 4, 5, 6].map((day) => [day, day]),
    );
    expect(problem.floors.map(({ dayIndex }) => dayIndex)).toEqual([0, 1, 2, 3, 4, 5, 6]);
  });

  it('carries percentages and rules, and nothing of the night window', () => {
    expect(problemOf().pay).toEqual({
      nightPercent: 25,
      weekendPercent: 20,
      holidayPercent: 100,
      overtimeSteps: [{ overMinutes: 0, percent: 150 }],
    });
    expect(problemOf().rules).toMatchObject(partsOf().rules);
  });

  it('can be proved as it stands', () => {
    const proof = proveRoster(problemOf(), []);
    expect(proof.shortageMinutes).toBe(7 * 480);
    expect(proof.breaches.map(({ rule }) => rule)).toEqual(['contractHours']);
  });

  it('without floors, kinds or people is still a problem', () => {
    const problem = problemOf({ floors: [], shiftKinds: [], people: [] });
    expect(problemSchema.parse(problem)).toEqual(problem);
  });
});

describe('shifts of a kind', () => {
  it('keep name, posts and night mark, and carry the minutes of each premium', () => {
    const kind = { ...nightKind, skillIds: [vet.id], unpaidBreakMinutes: 30 };
    const holidays = [{ date: '2027-02-07', name: 'Lantern Day' }];
    const [monday, ...others] = problemOf({ shiftKinds: [kind], holidays }).shifts;
    expect(monday).toEqual({
      index: 0,
      kindId: 'knd_night',
      kindName: 'Night',
      dayIndex: 0,
      startMinute: 1320,
      endMinute: 1800,
      paidMinutes: 450,
      nightMinutes: 390,
      weekendMinutes: 0,
      holidayMinutes: 0,
      isNight: true,
      postSkillIds: [vet.id],
    });
    // Saturday 22:00 to 06:00 with a break from 01:45 to 02:15; the holiday is the Sunday.
    expect(others[4]).toMatchObject({ weekendMinutes: 450, holidayMinutes: 330 });
    expect(others[5]).toMatchObject({ weekendMinutes: 120, holidayMinutes: 120 });
  });

  /** Elapsed minutes by the IANA zone database; the clock of Berlin changes on these Sundays. */
  it.each([
    ['2026-03-23', '2026-03-29', 420, 1380],
    ['2026-10-19', '2026-10-25', 540, 1500],
  ])(
    'of the week from %s are as long as the clock change makes them',
    (startsOn, endsOn, minutes, sunday) => {
      const kinds = [nightKind, kindOf()];
      const problem = problemOf({ startsOn, endsOn, shiftKinds: kinds });
      const nights = problem.shifts.filter(({ isNight }) => isNight);
      expect(nights.map(({ paidMinutes }) => paidMinutes)).toEqual([
        ...Array(5).fill(480),
        minutes,
        480,
      ]);
      // The night of Saturday and the Early of Sunday still stand an hour apart.
      const early = problem.shifts.find(({ dayIndex, isNight }) => dayIndex === 6 && !isNight);
      expect((early?.startMinute ?? 0) - (nights[5]?.endMinute ?? 0)).toBe(60);
      const after = assembleProblem(partsOf({ startsOn, endsOn: '2026-11-30' })).problem.days[7];
      expect((after?.startMinute ?? 0) - 6 * 1440).toBe(sunday);
    },
  );

  it('that the skipped hour swallows are left out with a note', () => {
    const short = kindOf({ name: 'Short', startMinute: 120, endMinute: 180 });
    const { problem, notes } = assembleProblem(
      partsOf({ startsOn: '2026-03-28', endsOn: '2026-03-30', shiftKinds: [short] }),
    );
    expect(problem.shifts.map(({ index, dayIndex }) => [index, dayIndex])).toEqual([
      [0, 0],
      [1, 2],
    ]);
    expect(notes).toEqual([
      'Short on 2026-03-29 falls into the hour the clock skips, so it is left out.',
    ]);
  });
});

describe('floors by date', () => {
  const needs = [1, 2, 3, 4, 5, 6, 7, 8];
  const holidays = [{ date: '2027-02-03', name: 'Lantern Day' }];
  const peopleByDay = (floor: Parameters<typeof floorOf>[0]) => {
    const { floors } = problemOf({ floors: [floorOf({ needs, ...floor })], holidays });
    return [0, 1, 2, 3, 4, 5, 6].map(
      (day) => floors.find(({ dayIndex }) => dayIndex === day)?.people ?? 0,
    );
  };

  it.each([
    ['weekday columns, and the holiday column on a holiday', {}, [1, 2, 8, 4, 5, 6, 7]],
    [
      'a date of its own comes before both',
      { dates: ['2027-02-02', '2027-02-03'].map((date) => ({ date, people: 9, reason: '' })) },
      [1, 9, 9, 4, 5, 6, 7],
    ],
    [
      'a date of its own may ask for nobody',
      { dates: [{ date: '2027-02-02', people: 0, reason: '' }] },
      [1, 0, 8, 4, 5, 6, 7],
    ],
    [
      'only from the first to the last effective day, both included',
      { effectiveFrom: '2027-02-02', effectiveTo: '2027-02-05' },
      [0, 2, 8, 4, 5, 0, 0],
    ],
    [
      'dates of their own outside those days do not count',
      { effectiveTo: '2027-02-05', dates: [{ date: '2027-02-06', people: 9, reason: '' }] },
      [1, 2, 8, 4, 5, 0, 0],
    ],
    ['not in force at all', { effectiveFrom: '2027-03-01' }, [0, 0, 0, 0, 0, 0, 0]],
  ])('%s', (_, floor, expected) => {
    expect(peopleByDay(floor)).toEqual(expected);
  });

  it('keep what the floor says, on the time axis', () => {
    const floor = floorOf({ startMinute: 1320, endMinute: 1800, priceCentsPerHour: 900 });
    const { floors } = problemOf({ startsOn: '2026-03-28', endsOn: '2026-03-28', floors: [floor] });
    expect(floors).toEqual([
      {
        floorId: 'flr_one',
        dayIndex: 0,
        startMinute: 1320,
        endMinute: 1740,
        skillId: 'ski_nurse',
        people: 1,
        counting: 'seated',
        priceCentsPerHour: 900,
        priority: 1,
      },
    ]);
  });
});

describe('shifts of the period before', () => {
  const lastNight = {
    personId: personOf().id,
    date: '2027-01-31',
    startsAtUtc: Date.parse('2027-01-31T21:00:00Z'),
    endsAtUtc: Date.parse('2027-02-01T05:00:00Z'),
    isNight: true,
    postSkillId: 'ski_nurse',
  } as const;

  it('stand before minute 0, oldest first, within the days that matter', () => {
    const earlier = (days: number) => ({
      ...lastNight,
      date: `2027-01-${31 - days}`,
      startsAtUtc: lastNight.startsAtUtc - days * 86_400_000,
      endsAtUtc: lastNight.endsAtUtc - days * 86_400_000,
    });
    const own = problemOf({ history: [lastNight, earlier(7), earlier(6)] }).people[0]?.history;
    expect(own).toEqual([
      { dayIndex: -7, startMinute: -6 * 1440 - 120, endMinute: -6 * 1440 + 360, isNight: true },
      { dayIndex: -1, startMinute: -120, endMinute: 360, isNight: true },
    ]);
  });

  it('go back as far as the longest run that is allowed', () => {
    const old = { ...lastNight, date: '2027-01-22' };
    const rules = { ...partsOf().rules, longestRunDays: 10 };
    expect(problemOf({ history: [old] }).people[0]?.history).toEqual([]);
    expect(problemOf({ history: [old], rules }).people[0]?.history.length).toBe(1);
  });

  it('hold the floors of the first morning, so that the border is not short by itself', () => {
    const floors = [floorOf({ startMinute: 0, endMinute: 420 })];
    const first = (history: ProblemParts['history']) =>
      problemOf({ floors, history }).floors.filter(({ dayIndex }) => dayIndex === 0);
    expect(first([])).toMatchObject([{ startMinute: 0, endMinute: 420, people: 1 }]);
    expect(first([lastNight])).toMatchObject([{ startMinute: 360, endMinute: 420, people: 1 }]);
  });

  it('serve the floor of their own night first', () => {
    const floors = [
      floorOf({ startMinute: 1320, endMinute: 1800 }),
      floorOf({ id: 'flr_two', startMinute: 0, endMinute: 420 }),
    ];
    const { floors: left } = problemOf({ floors, history: [lastNight] });
    expect(
      left.filter(({ floorId, dayIndex }) => floorId === 'flr_two' && dayIndex === 0),
    ).toMatchObject([{ startMinute: 0, endMinute: 420, people: 1 }]);
  });
});
