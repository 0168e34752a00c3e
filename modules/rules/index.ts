export * from './rule-set';
