import { z } from 'zod';
import type { ShiftKindId, SkillId, TeamId } from '../units';
import { endMinuteSchema, startMinuteSchema } from './window';

/** What a user enters for one shift kind. Minutes are of the local day; an end beyond 1440 is past midnight. */
export const shiftKindInputSchema = z
  .strictObject({
    name: z
      .string()
      .trim()
      .min(1, 'Give the shift kind a name, for example Early.')
      .max(40, 'Keep the name under 40 characters.'),
    letter: z
      .string()
      .trim()
      .min(1, 'Give one to three letters for the brick.')
      .max(3, 'Give one to three letters for the brick.'),
    startMinute: startMinuteSchema,
    endMinute: endMinuteSchema,
    unpaidBreakMinutes: z
      .int('Write the break in whole minutes.')
      .min(0, 'A break cannot be negative.')
      .max(240, 'A break can be at most 240 minutes.'),
    isNight: z.boolean(),
    /** Skills that may be posted on it; null: all. */
    skillIds: z.array(z.string()).min(1, 'Choose at least one skill, or all.').nullable(),
  })
  .refine(
    (kind) => kind.endMinute > kind.startMinute && kind.endMinute - kind.startMinute <= 1440,
    {
      path: ['endMinute'],
      message: 'A shift ends after it starts and lasts at most 24 hours.',
    },
  )
  .refine((kind) => kind.unpaidBreakMinutes < kind.endMinute - kind.startMinute, {
    path: ['unpaidBreakMinutes'],
    message: 'The break must be shorter than the shift.',
  });
export type ShiftKindInput = z.infer<typeof shiftKindInputSchema>;

export interface ShiftKind extends ShiftKindInput {
  readonly id: ShiftKindId;
  readonly teamId: TeamId;
  readonly skillIds: SkillId[] | null;
  /** Retired kinds stay on old rosters and are offered no more. */
  readonly isRetired: boolean;
}
