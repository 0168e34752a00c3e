import type { Problem, ProblemCeiling } from '../../problem';
import type { CoverIndex } from '../cover-index';
import type { ModelBuilder } from '../model-builder';
import { centsFor } from '../pay';
import { type CoveredSlice, coverSlices, type Stretch, sliceWindows } from '../time-slices';
import type { WorkColumn } from '../work-columns';

/** A slice of a ceiling as a row. */
export interface CeilingRow extends Stretch {
  readonly row: number;
  readonly ceilingId: string;
  /** Position in problem.ceilings. */
  readonly ceilingIndex: number;
  readonly skillId: string | null;
  readonly counting: ProblemCeiling['counting'];
  readonly people: number;
  readonly covering: readonly WorkColumn[];
  readonly excessColumn: number;
  /** null: firm. */
  readonly priceCentsPerHour: number | null;
}

/**
 * Ceilings: cover - excess <= people in every slice of time; each ceiling stands alone. Rows
 * ceiling(number, start), columns excess(number, start), whose minutes are the objective `surplus` of firm
 * ceilings, and whose price is part of the objective `cost` of the others. Slices that never hold more
 * people than the ceiling have no row. Source: the supervisor.
 */
export function addCeilingRows(
  builder: ModelBuilder,
  problem: Problem,
  index: CoverIndex,
): CeilingRow[] {
  return problem.ceilings.flatMap((ceiling, ceilingIndex) => {
    const counts = countsFor(problem, ceiling);
    const slices = sliceWindows([ceiling], index.edgesWithin(ceiling));
    return coverSlices(slices, (slice) => index.covering(slice, counts))
      .filter(({ covering }) => peopleIn(covering) > ceiling.people)
      .map((slice) => addCeilingRow(builder, ceiling, ceilingIndex, slice));
  });
}

const peopleIn = (covering: readonly WorkColumn[]): number =>
  new Set(covering.map(({ personIndex }) => personIndex)).size;

function countsFor(
  { people }: Problem,
  { skillId, counting }: ProblemCeiling,
): (work: WorkColumn) => boolean {
  if (skillId === null) return () => true;
  if (counting === 'seated') return (work) => work.postSkillId === skillId;
  return ({ personIndex }) => people[personIndex]?.skillIds.includes(skillId) ?? false;
}

function addCeilingRow(
  builder: ModelBuilder,
  { ceilingId, skillId, counting, people, priceCentsPerHour }: ProblemCeiling,
  ceilingIndex: number,
  { startMinute, endMinute, covering }: CoveredSlice<ProblemCeiling, WorkColumn>,
): CeilingRow {
  const place = `${ceilingIndex},${startMinute}`;
  const minutes = endMinute - startMinute;
  const excessColumn = builder.addColumn({
    name: `excess(${place})`,
    upper: peopleIn(covering) - people,
    costs:
      priceCentsPerHour === null
        ? { surplus: minutes }
        : { cost: centsFor(priceCentsPerHour, minutes) },
  });
  const row = builder.addRow({
    name: `ceiling(${place})`,
    upper: people,
    entries: [...covering.map(({ column }) => [column, 1] as const), [excessColumn, -1]],
  });
  return {
    row,
    ceilingId,
    ceilingIndex,
    skillId,
    counting,
    startMinute,
    endMinute,
    people,
    covering,
    excessColumn,
    priceCentsPerHour,
  };
}
