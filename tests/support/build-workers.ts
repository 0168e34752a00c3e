import { buildWorker } from '@/modules/solver/build-worker.mjs';

/** Solver threads run a bundled file: it is built once before all tests. */
export default buildWorker;
