import { z } from 'zod';
import {
  centsSchema,
  type FloorId,
  type LocalDate,
  localDateSchema,
  type SkillId,
  type TeamId,
} from '../units';
import { endMinuteSchema, startMinuteSchema } from './window';

/** The columns of a weekly pattern: Monday 0 to Sunday 6, then 7 for public holidays. */
export const patternDays = [0, 1, 2, 3, 4, 5, 6, 7] as const;
export const holidayColumn = 7;

/** Least people on duty, 0 to 999. */
export const peopleSchema = z
  .int('Write a whole number of people.')
  .min(0, 'A floor cannot be below 0 people.')
  .max(999, 'A floor can be at most 999 people.');

const windowMessage = 'A window ends after it starts and lasts at most 24 hours.';

/** What a user enters for one floor. Minutes are of the local day; an end beyond 1440 is past midnight. */
export const floorInputSchema = z
  .strictObject({
    /** null: anybody on duty counts. */
    skillId: z.string().nullable(),
    startMinute: startMinuteSchema,
    endMinute: endMinuteSchema,
    /** People needed for Monday to Sunday and holidays: eight numbers. */
    needs: z.array(peopleSchema).length(8, 'Give eight numbers: Monday to Sunday and holidays.'),
    counting: z.enum(['seated', 'shared']),
    /** null: firm. Otherwise the price of one missing person for one hour. */
    priceCentsPerHour: centsSchema.nullable(),
    effectiveFrom: localDateSchema,
    effectiveTo: localDateSchema.nullable(),
  })
  .refine(
    (floor) => floor.endMinute > floor.startMinute && floor.endMinute - floor.startMinute <= 1440,
    {
      path: ['endMinute'],
      message: windowMessage,
    },
  )
  .refine((floor) => floor.effectiveTo === null || floor.effectiveFrom <= floor.effectiveTo, {
    path: ['effectiveTo'],
    message: 'The last day cannot be before the first day.',
  });
export type FloorInput = z.infer<typeof floorInputSchema>;

/** A floor on one date that differs from its weekly pattern. */
export const floorDateSchema = z.strictObject({
  date: localDateSchema,
  people: peopleSchema,
  reason: z.string().trim().max(200, 'Keep the reason under 200 characters.'),
});
export type FloorDate = z.infer<typeof floorDateSchema>;

export interface Floor extends FloorInput {
  readonly id: FloorId;
  readonly teamId: TeamId;
  readonly skillId: SkillId | null;
  readonly dates: readonly FloorDate[];
}

export interface Holiday {
  readonly date: LocalDate;
  readonly name: string;
}
