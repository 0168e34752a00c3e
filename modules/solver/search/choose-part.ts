import type { RosterModel } from '../../model';
import type { Ground } from './first-roster';

/** What a fix-and-optimise step frees: some people (null: all) over some days (null: all). */
export interface Choice {
  readonly people: ReadonlySet<number> | null;
  readonly days: { readonly from: number; readonly to: number } | null;
}

/** Columns of the chosen cells, with the weekend marks of the chosen people. */
export function freeColumns(model: RosterModel, { people, days }: Choice): Uint8Array {
  const isFree = new Uint8Array(model.linear.columnNames.length);
  model.works.forEach(({ columns, personIndex }) => {
    if (people && !people.has(personIndex)) return;
    for (const { column, shift } of columns) {
      if (!days || (shift.dayIndex >= days.from && shift.dayIndex < days.to)) isFree[column] = 1;
    }
    for (const { column } of model.weekends[personIndex] ?? []) isFree[column] = 1;
  });
  return isFree;
}

/** Days of the part that is free in both: about so many of all days. */
const partDays = 0.4;

/**
 * So many people that about `size` columns are free: one at random, then those who can do most of the same
 * work, with some chance in it, so that they have something to exchange.
 */
export function choosePeople(
  { model, space }: Ground,
  size: number,
  name: 'people' | 'part',
  random: () => number,
): ReadonlySet<number> {
  const { works } = model;
  const share = name === 'part' ? partDays : 1;
  const first = Math.floor(random() * works.length);
  const skills = new Set(space.lines[first]?.person.skillIds);
  const kin = works
    .map(({ person, personIndex }) => ({
      personIndex,
      rank: random() + 0.5 * person.skillIds.filter((skill) => skills.has(skill)).length,
    }))
    .sort((one, other) => other.rank - one.rank);
  const chosen = new Set<number>([first]);
  let columns = (works[first]?.columns.length ?? 0) * share;
  for (const { personIndex } of kin) {
    if (columns >= size && chosen.size >= 2) break;
    if (chosen.has(personIndex)) continue;
    chosen.add(personIndex);
    columns += (works[personIndex]?.columns.length ?? 0) * share;
  }
  return chosen;
}

/** A window of days somewhere in the period: as long as about `size` columns of everybody allow. */
export function chooseDays(
  { model, space }: Ground,
  size: number,
  name: 'days' | 'part',
  random: () => number,
): { readonly from: number; readonly to: number } {
  const all = model.works.reduce((sum, { columns }) => sum + columns.length, 0);
  const wanted = name === 'part' ? space.dayCount * partDays : (space.dayCount * size) / all;
  const length = Math.min(space.dayCount, Math.max(2, Math.round(wanted)));
  // Windows may hang over either end, so that the outer days are freed as often as the inner ones.
  const from = Math.floor(random() * (space.dayCount + length - 1)) - length + 1;
  return { from: Math.max(0, from), to: Math.min(space.dayCount, from + length) };
}
