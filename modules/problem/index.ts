export { assembleProblem } from './assemble-problem';
export * from './bound-record';
export { type CapacityLack, capacityLacks } from './capacity';
export { type ClockRules, type PaidSplit, type Stint, splitByClock } from './clock-split';
export { type ContractTerms, readTerms } from './contract-terms';
export { describeRequirement } from './describe-requirement';
export * from './fairness';
export { type Footing, footingOf } from './footing';
export { creditIn } from './leave-in-period';
export { loosen } from './loosen-requirement';
export * from './problem';
export {
  type AssembledProblem,
  historyDays,
  type NeighbourShift,
  type PinnedCell,
  type ProblemParts,
} from './problem-parts';
export * from './problem-rules';
export { readProblem } from './read-problem';
export * from './requirement';
export { requirementsOf } from './requirements-of';
export { creditOf } from './returned-credit';
export * from './sizing-problem';
export * from './team-rules';
export { everyMinute, without } from './without-requirements';
