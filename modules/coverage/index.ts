export type * from './coverage';
export * from './floor';
export * from './floor-changes';
export * from './need-on';
export * from './same-cover';
export * from './shift-kind';
export * from './tone';
