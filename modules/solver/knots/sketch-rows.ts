import type { Entry, LinearModel, RosterModel } from '../../model';
import type { Problem, Requirement } from '../../problem';
import { ownerOfRow } from './row-owner';

/** A row before it can be bent: parts by requirement, and what it counts. */
export interface RowSketch {
  readonly name: string;
  readonly entries: readonly Entry[];
  readonly lower: readonly (readonly [
    requirement: Requirement,
    amount: number,
    isBinding: boolean,
  ])[];
  readonly upper: readonly (readonly [
    requirement: Requirement,
    amount: number,
    isBinding: boolean,
  ])[];
}

/** Rows of the compact model by what they are there for; hours and what bars shifts come from `barRows`. */
export function sketchRows(problem: Problem, model: RosterModel): RowSketch[] {
  const shared = new Map<number, Pick<RowSketch, 'lower' | 'upper'>>();
  for (const { row, floors } of model.floors) {
    const lower = floors.map(
      ({ floorId, dayIndex, people }) =>
        [{ kind: 'floor', floorId, dayIndex }, people, true] as const,
    );
    shared.set(row, { lower, upper: [] });
  }
  for (const { row, ceilingIndex, people } of model.ceilings) {
    const { ceilingId = '', dayIndex = 0 } = model.problem.ceilings[ceilingIndex] ?? {};
    const ceiling = { kind: 'ceiling', ceilingId, dayIndex } as const;
    shared.set(row, { lower: [], upper: [[ceiling, people, true]] });
  }
  for (const { row, ruleId, lower, upper } of model.teamRows) {
    shared.set(row, boundsBy({ kind: 'teamRule', ruleId }, lower, upper));
  }
  const levels = new Set(model.levels.map(({ row }) => row));
  const { linear } = model;
  return linear.rowNames.flatMap((name, row): RowSketch[] => {
    if (levels.has(row) || name.startsWith('hours(')) return [];
    const entries = entriesOf(linear, row);
    const owner = ownerOfRow(problem, name);
    const [lower, upper] = [linear.rowLower[row] ?? 0, linear.rowUpper[row] ?? 0];
    const bounds = shared.get(row) ?? boundsBy(owner, lower, upper);
    return [{ name, entries, ...bounds }];
  });
}

/** A missing requirement binds always. */
const always: Requirement = { kind: 'teamRule', ruleId: '' };

function boundsBy(owner: Requirement | null, lower: number, upper: number) {
  const by = (amount: number) =>
    Number.isFinite(amount) ? [[owner ?? always, amount, true] as const] : [];
  return { lower: by(lower), upper: by(upper) };
}

function entriesOf({ starts, indices, values }: LinearModel, row: number): Entry[] {
  const [from, to] = [starts[row] ?? 0, starts[row + 1] ?? 0];
  return Array.from({ length: to - from }, (_, at) => [
    indices[from + at] ?? 0,
    values[from + at] ?? 0,
  ]);
}
