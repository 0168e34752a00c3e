export { sumPerson } from './sum-person';
export type * from './views';
