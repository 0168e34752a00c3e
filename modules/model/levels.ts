import type { Entry, ModelBuilder } from './model-builder';
import type { CeilingRow } from './rows/ceiling-rows';
import type { FloorRow } from './rows/floor-rows';
import type { TeamRow } from './rows/team-rows';

/**
 * What counts before any cost, one level after the other: units by which firm team rules are broken,
 * person-minutes above firm ceilings, missing person-minutes of firm floors by priority.
 */
export interface Level {
  readonly name: 'teamRules' | 'surplus' | 'shortage';
  /** Of firm floors; null for the other levels. */
  readonly priority: number | null;
  /** The objective of the model that this level makes least. */
  readonly objective: string;
  /** The row that holds its whole sum; the levels after it and the cost put its least on it. */
  readonly row: number;
  /** Every roster's value is a multiple of this. */
  readonly step: number;
}

/** Objective of the firm floors of one priority. */
export const shortageObjective = (priority: number): string => `shortage${priority}`;

/** One column of a level: its weight in the sum, and the step in which its value counts. */
interface Part {
  readonly entry: Entry;
  readonly step: number;
}

/**
 * Adds the levels that have anything to count, in their order: the objective and the row of each, without
 * a limit until a later stage sets one. Rows teamRules, surplus and shortage1 to shortage9.
 */
export function addLevels(
  builder: ModelBuilder,
  floors: readonly FloorRow[],
  ceilings: readonly CeilingRow[],
  teamRows: readonly TeamRow[],
): Level[] {
  const priorities = Array.from({ length: 9 }, (_, index) => index + 1);
  const candidates = [
    { name: 'teamRules' as const, priority: null, parts: partsOfTeamRules(teamRows) },
    { name: 'surplus' as const, priority: null, parts: partsOfCeilings(ceilings) },
    ...priorities.map((priority) => ({
      name: 'shortage' as const,
      priority,
      parts: partsOfFloors(floors, priority),
    })),
  ];
  return candidates
    .filter(({ parts }) => parts.length > 0)
    .map(({ name, priority, parts }) => {
      const objective = priority === null ? name : shortageObjective(priority);
      builder.addObjective(objective, 'minimise');
      const row = builder.addRow({ name: objective, entries: parts.map(({ entry }) => entry) });
      const step = parts.map((part) => part.step).reduce(greatestDivisor, 0);
      return { name, priority, objective, row, step };
    });
}

const partsOfTeamRules = (rows: readonly TeamRow[]): Part[] =>
  rows
    .filter(({ priceCents }) => priceCents === null)
    .flatMap(({ underColumn, overColumn }) =>
      [underColumn, overColumn].flatMap((column) =>
        column === null ? [] : [{ entry: [column, 1] as const, step: 1 }],
      ),
    );

const partsOfCeilings = (rows: readonly CeilingRow[]): Part[] =>
  rows
    .filter(({ priceCentsPerHour }) => priceCentsPerHour === null)
    .map(({ excessColumn, startMinute, endMinute }) => {
      const minutes = endMinute - startMinute;
      return { entry: [excessColumn, minutes] as const, step: minutes };
    });

const partsOfFloors = (rows: readonly FloorRow[], priority: number): Part[] =>
  rows.flatMap(({ startMinute, endMinute, shorts }) =>
    shorts
      .filter((short) => short.priority === priority)
      .map(({ column }) => {
        const minutes = endMinute - startMinute;
        return { entry: [column, minutes] as const, step: minutes };
      }),
  );

export function greatestDivisor(one: number, other: number): number {
  return other === 0 ? Math.abs(one) : greatestDivisor(other, one % other);
}
