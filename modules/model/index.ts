export * from './linear-model';
export * from './model-builder';
export { completeValues, openFloors, placeRoster, readRoster } from './read-roster';
export * from './read-sizing';
export * from './roster-model';
export * from './sizing-model';
export * from './weigh-roster';
export { findObstacle, type Obstacle, type PersonWork, type WorkColumn } from './work-columns';
export * from './write-lp';
