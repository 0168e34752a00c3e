/** Every rule a roster is re-checked against, in the order of the proof, in words for the reader. */
export const proofRules = {
  references: 'Only people, shifts and posts of this period',
  oneShiftADay: 'At most one shift a day',
  post: 'A post the person is skilled for and the shift has',
  absence: 'No shift in leave or outside the contract',
  nightPermission: 'Nights only for people who may work them',
  restMinutes: 'Rest between shifts',
  kindsThatMayNotFollow: 'Shift kinds that may not follow one another',
  longestRunDays: 'Days in a row, at most',
  longestRunNights: 'Nights in a row, at most',
  shortestRunDays: 'Days in a row, at least',
  shortestRunFreeDays: 'Days off in a row, at least',
  nightsPerPeriod: 'Nights in the period',
  kindLimits: 'Shifts of one kind in the period',
  weekendsPerPeriod: 'Weekends worked in the period',
  contractHours: 'Contract hours, least and most',
  pins: 'Pinned shifts and days off',
  teamRules: 'Rules that join people',
} as const;

export type ProofRule = keyof typeof proofRules;
