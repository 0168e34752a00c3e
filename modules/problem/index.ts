export { assembleProblem } from './assemble-problem';
export { type ClockRules, type PaidSplit, type Stint, splitByClock } from './clock-split';
export { type ContractTerms, readTerms } from './contract-terms';
export { type Footing, footingOf } from './footing';
export { creditIn } from './leave-in-period';
export * from './problem';
export {
  type AssembledProblem,
  historyDays,
  type PastShift,
  type PinnedCell,
  type ProblemParts,
} from './problem-parts';
export * from './sizing-problem';
