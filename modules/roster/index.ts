export { axisMinutesOf, coverLanes, type Duty } from './cover-lanes';
export * from './roster-input';
export type * from './views';
