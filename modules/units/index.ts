export * from './clock-time';
export * from './date-range';
export * from './dates';
export * from './errors';
export * from './id-schema';
export type * from './ids';
export * from './money';
export * from './result';
export * from './zones';
