export * from './date-words';
export * from './fake-mail';
export type * from './publication';
