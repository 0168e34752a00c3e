import {
  blendObjective,
  buildRosterModel,
  hasLine,
  objectiveOf,
  placeRoster,
  type RosterModel,
  withLevelBlend,
} from '../../model';
import type { PlannedRoster, Problem } from '../../problem';
import { costOf } from '../lines/line-cost';
import type { Part } from '../lines/part';
import type { Pattern } from '../lines/pattern-master';
import { Refill } from '../lines/refill';
import { dayOff, RosterLines } from '../lines/roster-lines';
import { makeSearchSpace, type SearchSpace } from '../lines/search-space';

/** A problem made ready for a search. */
export interface Ground {
  readonly model: RosterModel;
  readonly space: SearchSpace;
  /** Cents of the blend that no roster changes. */
  readonly offset: number;
  readonly lines: RosterLines;
  readonly refill: Refill;
}

/** Builds model and nets, in this thread. */
export function prepareGround(problem: Problem): Ground {
  const model = withLevelBlend(buildRosterModel(problem));
  const space = makeSearchSpace(model, blendObjective);
  const lines = new RosterLines(space);
  const offset = objectiveOf(model.linear, blendObjective).offset;
  return { model, space, offset, lines, refill: new Refill(lines) };
}

/**
 * People without any lawful line, by position: their nets have no path with the shifts they can work. Each
 * is told alone and exactly, whatever the floors ask, but for limits that the net does not count.
 */
export function findClashes({ lines, refill, space }: Ground): number[] {
  const anything = { coverPrice: () => 0, noise: () => 0, endPrice: () => 0 };
  return space.lines.flatMap(({ net }, person) => {
    if (!hasLine(net)) return [person];
    const { least } = refill.cheapestLines(person, anything, 1);
    lines.nodes.fill(-1, person * (lines.days + 1), (person + 1) * (lines.days + 1));
    return Number.isFinite(least) ? [] : [person];
  });
}

/** Puts a whole roster into the lines; people whose line breaks a rule are left out, by position. */
export function putRoster({ model, lines }: Ground, roster: PlannedRoster): number[] {
  const values = placeRoster(model, roster);
  lines.cells.fill(dayOff);
  lines.isIn.fill(0);
  for (const { columns, personIndex } of model.works) {
    for (const { column, shift } of columns) {
      if (values[column] === 1) lines.cells[personIndex * lines.days + shift.dayIndex] = column;
    }
  }
  const left: number[] = [];
  for (let person = 0; person < lines.people; person += 1) {
    if (lines.trace(person)) lines.isIn[person] = 1;
    else left.push(person);
  }
  lines.recount();
  return left;
}

/** The lines of some people as patterns. */
export const linesOf = ({ lines, space }: Ground, { people }: Pick<Part, 'people'>): Pattern[] =>
  people.map((person) => {
    const cells = lines.cells.slice(person * lines.days, (person + 1) * lines.days);
    const end = lines.endOf(person);
    return { person, cells, end, cost: costOf(space, person, cells, end) };
  });
