import { z } from 'zod';
import { centsSchema } from '../units';

/*
 * Sizing asks how many people on which shift patterns the floors take, before anybody is named: the
 * classic covering model. Time runs in a circle of `cycleMinutes` (a day or a week); an interval that
 * ends beyond the circle goes on at its start.
 */

const interval = { startMinute: z.int().min(0), endMinute: z.int().min(1) };

export const sizingFloorSchema = z.strictObject({
  /** The floor and the weekday (Monday 0) it is taken from: prices are reported for this pair. */
  floorId: z.string(),
  weekday: z.int().min(0).max(6),
  label: z.string(),
  skillId: z.string().nullable(),
  ...interval,
  people: z.int().min(0).max(9999),
});

export const sizingPatternSchema = z.strictObject({
  /** Unique in the problem. */
  id: z.string(),
  /** The line of the user's table this pattern was expanded from. */
  lineId: z.string(),
  label: z.string(),
  /** The skill in which a person on this pattern counts; null counts for floors of any skill only. */
  skillId: z.string().nullable(),
  /** Times on duty in one cycle. */
  duties: z.array(z.strictObject(interval)).min(1),
  /** Pay of one person on this pattern for one cycle. */
  costCents: centsSchema,
});

export const sizingCapSchema = z.strictObject({
  label: z.string(),
  lineIds: z.array(z.string()).min(1),
  /** Most people on these lines together, or most percent of everybody. */
  limit: z.union([
    z.strictObject({ people: z.int().min(0) }),
    z.strictObject({ percentOfAll: z.int().min(0).max(100) }),
  ]),
});

export const sizingProblemSchema = z.strictObject({
  version: z.literal(1),
  cycleMinutes: z.union([z.literal(1440), z.literal(10080)]),
  /** What is made least: the number of people, or their pay. */
  objective: z.enum(['people', 'pay']),
  floors: z.array(sizingFloorSchema),
  patterns: z.array(sizingPatternSchema).min(1).max(5000),
  caps: z.array(sizingCapSchema),
});

export type SizingProblem = z.infer<typeof sizingProblemSchema>;
export type SizingFloor = z.infer<typeof sizingFloorSchema>;
export type SizingPattern = z.infer<typeof sizingPatternSchema>;
export type SizingCap = z.infer<typeof sizingCapSchema>;

/** The answer of a sizing. Objective values are people or cents, as the problem's objective says. */
export interface SizingAnswer {
  /** Whether every floor holds within the caps. */
  readonly floorsHold: boolean;
  /** Least missing person-minutes over the cycle; 0 when the floors hold. */
  readonly shortageMinutes: number;
  readonly shortages: readonly {
    readonly floorId: string;
    readonly weekday: number;
    readonly label: string;
    /** Most people missing at once in this window, and missing person-minutes over it. */
    readonly people: number;
    readonly minutes: number;
  }[];
  /** Whole-number answer: people per pattern, only patterns with at least one. */
  readonly people: readonly { readonly patternId: string; readonly count: number }[];
  readonly objective: number;
  /** Value of the linear relaxation, with the shortage fixed at its least. */
  readonly linearBound: number;
  /** Proven lower bound of the whole-number problem and whether it was solved to the end. */
  readonly provenBound: number;
  readonly isProven: boolean;
  /** What one person more on this floor costs, from the duals of the linear relaxation. */
  readonly floorPrices: readonly {
    readonly floorId: string;
    readonly weekday: number;
    readonly label: string;
    readonly price: number;
  }[];
}
