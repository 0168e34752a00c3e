export { readPayRules, readRuleSet } from './store';
