import { z } from 'zod';
import { idSchema, plannedDateSchema } from '../units';

/** Opening a period needs its first day only; its length is the team's. */
export const openPeriodSchema = z.strictObject({ startsOn: plannedDateSchema });
export type OpenPeriodInput = z.infer<typeof openPeriodSchema>;

/** Starting a run; without a limit the longest one allowed is taken. */
export const startRunSchema = z.strictObject({
  limitSeconds: z
    .int('Write a whole number of seconds.')
    .min(5, 'A run takes at least 5 seconds.')
    .max(3600, 'A run takes at most an hour (3600 seconds).')
    .optional(),
});
export type StartRunInput = z.infer<typeof startRunSchema>;

/** Publishing; a roster that is short is published only when that is accepted. */
export const publishSchema = z.strictObject({ acceptShortage: z.boolean().optional() });
export type PublishInput = z.infer<typeof publishSchema>;

/** Confirming one published version. */
export const confirmSchema = z.strictObject({ versionId: idSchema('ver') });
export type ConfirmInput = z.infer<typeof confirmSchema>;

/** Text formats of a run's model; without a word the LP format. */
export const modelQuerySchema = z.strictObject({ format: z.enum(['lp', 'mps']).default('lp') });
export type ModelFormat = z.infer<typeof modelQuerySchema>['format'];

/** Ways out of one knot of a run, by its place in the list. */
export const waysOutSchema = z.strictObject({ knot: z.int().min(0).max(1000) });
export type WaysOutInput = z.infer<typeof waysOutSchema>;
