import { z } from 'zod';
import type { Id, IdPrefix } from './ids';

/** Zod type of an id with this prefix, for addresses and bodies: `idSchema('flr')` takes `flr_...` only. */
export const idSchema = <P extends IdPrefix>(prefix: P): z.ZodType<Id<P>> =>
  z.custom<Id<P>>(
    (value) => typeof value === 'string' && value.startsWith(`${prefix}_`),
    `Give an id that begins with ${prefix}_.`,
  );
