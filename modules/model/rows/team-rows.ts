import type { TeamRule, TeamRuleKind } from '../../problem';
import type { Entry, ModelBuilder } from '../model-builder';
import type { WorkColumn } from '../work-columns';
import { sketchTeamRows, type TeamParts, type TeamSketch } from './team-sketches';

/** One column of a team rule and what it counts. */
export interface TeamEntry {
  readonly work: WorkColumn;
  readonly coefficient: number;
}

/**
 * One row of a team rule: lower <= sum of coefficient x work + under - over <= upper. `under` and `over`
 * are the units by which it is broken.
 */
export interface TeamRow {
  readonly row: number;
  readonly ruleId: string;
  readonly kind: TeamRuleKind;
  /** `together`: the shift; `apart`: the minute; `mostFree`: the day; otherwise null. */
  readonly at: number | null;
  readonly entries: readonly TeamEntry[];
  /** Columns of `budget` besides those of shifts: overtime. */
  readonly others: readonly Entry[];
  readonly lower: number;
  readonly upper: number;
  readonly underColumn: number | null;
  readonly overColumn: number | null;
  /** null: firm. */
  readonly priceCents: number | null;
}

/**
 * Rules that join people. Rows team(rule, place), columns under(rule, place) and over(rule, place), whose
 * sum is the objective `teamRules` of firm rules; for the others each unit costs priceCents. What each
 * kind counts: `sketchTeamRows`. A row that nobody can break is left out. Source: the supervisor.
 */
export function addTeamRows(builder: ModelBuilder, parts: TeamParts): TeamRow[] {
  return parts.problem.teamRules.flatMap((rule, ruleIndex) =>
    sketchTeamRows(rule, parts).map((sketch) => addTeamRow(builder, rule, ruleIndex, sketch)),
  );
}

function addTeamRow(
  builder: ModelBuilder,
  { id, kind, priceCents }: TeamRule,
  ruleIndex: number,
  { at, entries, others = [], lower, upper }: TeamSketch,
): TeamRow {
  const place = at === null ? `${ruleIndex}` : `${ruleIndex},${at}`;
  const costs = priceCents === null ? { teamRules: 1 } : { cost: priceCents };
  const underColumn =
    lower === undefined ? null : builder.addColumn({ name: `under(${place})`, costs });
  const overColumn =
    upper === undefined ? null : builder.addColumn({ name: `over(${place})`, costs });
  const bounds = {
    lower: lower ?? Number.NEGATIVE_INFINITY,
    upper: upper ?? Number.POSITIVE_INFINITY,
  };
  const row = builder.addRow({
    name: `team(${place})`,
    ...bounds,
    entries: [
      ...entries.map(({ work, coefficient }): Entry => [work.column, coefficient]),
      ...others,
      ...(underColumn === null ? [] : [[underColumn, 1] as const]),
      ...(overColumn === null ? [] : [[overColumn, -1] as const]),
    ],
  });
  return {
    row,
    ruleId: id,
    kind,
    at,
    entries,
    others,
    ...bounds,
    underColumn,
    overColumn,
    priceCents,
  };
}
