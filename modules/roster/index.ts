export { axisMinutesOf, coverLanes, type Duty } from './cover-lanes';
export type * from './knot-views';
export * from './roster-input';
export type * from './views';
