import { buildRosterModel, type Entry, objectiveOf, type RosterModel } from '../../model';
import type { Problem, ProblemPerson } from '../../problem';
import { type AnalysisTools, countDown } from '../analysis-tools';
import { extendModel } from '../extend-model';
import type { CurvePoint } from './floor-price';
import { type LevelSession, openLevels } from './level-session';
import { pointOf } from './price-floors';

/**
 * Least cost and shortage against the number of people: without one person, with them, and with one to
 * `mostMore` more of the same skills and contract but without leave, pins or shifts around the period. All
 * stand in one model; who is not there has no shifts, and neither their hours nor their contract count. A
 * warm re-solve for each number. Fairness is left out: it would count the absent. null: out of time, or
 * somebody has no lawful line.
 */
export function curveOfPeople(
  tools: AnalysisTools,
  problem: Problem,
  personId: string,
  mostMore: number,
  limitSeconds: number,
): CurvePoint[] | null {
  const person = problem.people.find(({ id }) => id === personId);
  if (!person) return null;
  const time = countDown(tools, limitSeconds);
  const more = Array.from({ length: mostMore }, (_, index) => copyOf(person, index));
  const whole = { ...problem, fairness: [], people: [...problem.people, ...more] };
  const model = buildRosterModel(whole);
  const first = problem.people.length;
  const places = [problem.people.indexOf(person), ...more.map((_, index) => first + index)];
  const { linear } = model;
  const gates = places.map((place) => ({
    name: `there(p${place})`,
    entries: (model.works[place]?.columns ?? []).map(({ column }): Entry => [column, 1]),
  }));
  const extended = extendModel(linear, { columns: [], rows: gates, objectives: [] });
  const session = openLevels(tools, model, time, extended);
  const gateOf = (index: number): number => linear.rowNames.length + index;
  try {
    const points: CurvePoint[] = [];
    for (let there = 0; there <= places.length; there += 1) {
      places.forEach((place, index) => {
        setThere(session, model, place, gateOf(index), index < there);
      });
      const least = session.least(null);
      if (!least) return null;
      const absent = places.slice(there).map((place) => whole.people[place]);
      const unpaid = absent.reduce((sum, one) => sum + (one ? fixedCents(whole, one) : 0), 0);
      points.push(pointOf(there - 1, { ...least, costCents: least.costCents - unpaid }));
    }
    return points;
  } finally {
    session.close();
  }
}

const copyOf = (person: ProblemPerson, index: number): ProblemPerson => ({
  ...person,
  id: `${person.id} more ${index + 1}`,
  name: `${person.name} more ${index + 1}`,
  creditMinutes: 0,
  absences: [],
  history: [],
  following: [],
  pins: [],
  wishes: [],
});

/** Rows of hours and pins hold only for those who are there. */
function setThere(
  session: LevelSession,
  { linear }: RosterModel,
  place: number,
  gate: number,
  isThere: boolean,
): void {
  const [none, all] = [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY];
  session.changeRow(gate, none, isThere ? all : 0);
  linear.rowNames.forEach((name, row) => {
    if (!name.startsWith(`hours(p${place})`) && !name.startsWith(`pin(p${place},`)) return;
    session.changeRow(
      row,
      isThere ? (linear.rowLower[row] ?? none) : none,
      isThere ? (linear.rowUpper[row] ?? all) : all,
    );
  });
}

/** What a person costs before any shift: contract and wishes. */
function fixedCents(problem: Problem, person: ProblemPerson): number {
  const alone = { ...problem, people: [person], floors: [], ceilings: [], teamRules: [] };
  return objectiveOf(buildRosterModel(alone).linear, 'cost').offset;
}
