export type * from './linear-outcome';
export type * from './roster-outcome';
