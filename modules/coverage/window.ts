import { z } from 'zod';

const startMessage = 'Give a start between 00:00 and 23:59.';
const endMessage = 'Give an end between 00:01 and 24:00 of the next day.';

/** Start of a window or shift: local minute of its day, 0 to 1439. */
export const startMinuteSchema = z.int(startMessage).min(0, startMessage).max(1439, startMessage);

/** End of a window or shift: local minutes counted from the start's midnight; beyond 1440 is past midnight. */
export const endMinuteSchema = z.int(endMessage).min(1, endMessage).max(2880, endMessage);
