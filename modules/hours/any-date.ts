import type { DateRange } from '../units';

/** Every date that can be written, to ask for all periods there are. */
export const anyDate: DateRange = { from: '0001-01-01', to: '9999-12-31' };
