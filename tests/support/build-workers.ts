import { buildWorker } from '../../modules/solver/build-worker.mjs';

/** Runs once before all tests: the solver's worker is a built file. */
export default buildWorker;
