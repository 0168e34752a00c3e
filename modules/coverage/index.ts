export * from './floor';
export * from './shift-kind';
