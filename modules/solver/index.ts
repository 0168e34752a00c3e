export type * from './knots/knot';
export type * from './knots/way-out';
export type * from './linear-outcome';
export type * from './mend/mending';
export type { ThreadTask } from './messages';
export type * from './prices/floor-price';
export type * from './roster-outcome';
export type { JobEnd } from './run-job';
