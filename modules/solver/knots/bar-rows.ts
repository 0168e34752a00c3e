import type { Entry, PersonWork, RosterModel } from '../../model';
import {
  creditOf,
  type Problem,
  type ProblemPerson,
  type Requirement,
  rulesOf,
} from '../../problem';
import type { RowSketch } from './sketch-rows';

/**
 * What keeps a person off shifts altogether, and their hours, as rows of a knot model whose people have
 * none of it: absences, no Nights, limits of a kind, rest at the borders of the period, and contract hours
 * less the credit of the absences in force. Rows away, nonights, kindmost, edge and hours(person, number).
 */
export function barRows(problem: Problem, { works }: RosterModel): RowSketch[] {
  return problem.people.flatMap((person, index) => {
    const work = works[index];
    return work ? [...barsOf(problem, person, work), hoursRow(person, work)] : [];
  });
}

type Shift = PersonWork['columns'][number]['shift'];

function barsOf(problem: Problem, person: ProblemPerson, { columns, personIndex }: PersonWork) {
  const { id: personId } = person;
  const row = (
    name: string,
    requirement: Requirement,
    most: number,
    isMeant: (shift: Shift) => boolean,
  ): RowSketch => ({
    name: `${name}(p${personIndex})`,
    entries: columns.filter(({ shift }) => isMeant(shift)).map(({ column }): Entry => [column, 1]),
    lower: [],
    upper: [[requirement, most, true]],
  });
  const rest: Requirement = person.rules
    ? { kind: 'ownLimit', personId, limit: 'restMinutes' }
    : { kind: 'limit', limit: 'restMinutes' };
  const { restMinutes } = rulesOf(problem, person);
  const isTired = (shift: Shift): boolean =>
    person.history.some((past) => shift.startMinute < past.endMinute + restMinutes) ||
    person.following.some((next) => next.startMinute < shift.endMinute + restMinutes);
  const rows = [
    ...person.absences.map(({ startMinute, endMinute }) =>
      row(
        'away',
        { kind: 'absence', personId, startMinute, endMinute },
        0,
        (shift) => startMinute < shift.endMinute && shift.startMinute < endMinute,
      ),
    ),
    ...person.kindLimits.map(({ kindId, most }) =>
      row(
        'kindmost',
        { kind: 'kindLimit', personId, kindId },
        most,
        (shift) => shift.kindId === kindId,
      ),
    ),
    ...(person.mayWorkNights
      ? []
      : [row('nonights', { kind: 'noNights', personId }, 0, ({ isNight }) => isNight)]),
    row('edge', rest, 0, isTired),
  ];
  return rows.filter(({ entries }) => entries.length > 0);
}

/** minimum - credit <= worked <= maximum - credit; an absence that does not bind gives its credit back. */
function hoursRow(person: ProblemPerson, { columns, personIndex }: PersonWork): RowSketch {
  const { id: personId, minimumMinutes, maximumMinutes, creditMinutes } = person;
  const credits = person.absences.map(
    (absence) =>
      [
        {
          kind: 'absence',
          personId,
          startMinute: absence.startMinute,
          endMinute: absence.endMinute,
        },
        -creditOf(person, absence),
        false,
      ] as const,
  );
  const shared = credits.reduce((sum, [, amount]) => sum - amount, 0);
  return {
    name: `hours(p${personIndex})`,
    entries: columns.map(({ column, shift }) => [column, shift.paidMinutes]),
    lower: [[{ kind: 'leastHours', personId }, minimumMinutes - creditMinutes, true]],
    upper: [
      [{ kind: 'mostHours', personId }, maximumMinutes - creditMinutes + shared, true],
      ...credits,
    ],
  };
}
