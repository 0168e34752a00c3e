export * from './actor';
export * from './member';
export * from './permissions';
export type * from './team';
