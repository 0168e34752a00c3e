import { z } from 'zod';

/** Limits that every person of a team keeps; null switches a rule off. */
export const ruleSetSchema = z.strictObject({
  /** Least minutes between the end of a shift and the start of the next. */
  restMinutes: z.int().min(0),
  /** Most days in a row with a shift. */
  longestRunDays: z.int().min(1).nullable(),
  longestRunNights: z.int().min(1).nullable(),
  nightsPerPeriod: z.int().min(0).nullable(),
  /** Most weekends worked in the period. Weekend: local Saturday 00:00 to Sunday 24:00. */
  weekendsPerPeriod: z.int().min(0).nullable(),
  /** Whether a shift that starts on Friday and ends on Saturday makes that weekend a worked one. */
  weekendCountsFridayNight: z.boolean(),
});
export type RuleSet = z.infer<typeof ruleSetSchema>;
export type RuleName = keyof Omit<RuleSet, 'weekendCountsFridayNight'>;

/** Premiums in percent of the ordinary rate; they add up. Overtime is paid at its percentage. */
export const premiumsSchema = z.strictObject({
  nightPercent: z.int().min(0).max(1000),
  weekendPercent: z.int().min(0).max(1000),
  holidayPercent: z.int().min(0).max(1000),
  /** 150 means one and a half times the ordinary rate. */
  overtimePercent: z.int().min(100).max(1000),
});
export type Premiums = z.infer<typeof premiumsSchema>;

/** Premiums and the night window they are split by: local minutes of day, beyond 1440 past midnight. */
export interface PayRules extends Premiums {
  readonly nightStartMinute: number;
  readonly nightEndMinute: number;
}

/** Where each limit comes from, shown beside it. No legal advice: local law and agreements come first. */
export const ruleSources: Record<RuleName, { readonly label: string; readonly source: string }> = {
  restMinutes: {
    label: 'Rest between shifts',
    source: 'Directive 2003/88/EC, Art. 3: 11 consecutive hours in each 24 hours',
  },
  longestRunDays: {
    label: 'Days in a row, at most',
    source: 'House rule; UK HSE guidance HSG256 advises 5 to 7',
  },
  longestRunNights: {
    label: 'Nights in a row, at most',
    source: 'House rule; UK HSE guidance HSG256 advises 2 to 3 in a row',
  },
  nightsPerPeriod: { label: 'Nights in a period, at most', source: 'House rule' },
  weekendsPerPeriod: {
    label: 'Weekends worked in a period, at most',
    source: 'House rule; UK HSE guidance HSG256 advises regular free weekends',
  },
};
