export * from './proof';
export { type ProofRule, proofRules } from './proof-rules';
export { proveRoster } from './prove-roster';
export { proveSizing, type SizingHeadcount, type SizingProof } from './prove-sizing';
