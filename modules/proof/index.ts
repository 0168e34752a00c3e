export * from './proof';
export { type ProofRule, proofRules } from './proof-rules';
export { type BoundProof, proveBound } from './prove-bound';
export { proveRoster } from './prove-roster';
export { proveSizing, type SizingHeadcount, type SizingProof } from './prove-sizing';
export { readProof, type StoredProof } from './read-proof';
