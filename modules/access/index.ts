export * from './actor';
export * from './permissions';
