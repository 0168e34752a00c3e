export * from './problem';
export * from './sizing-problem';
