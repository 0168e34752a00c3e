import { buildWorkers } from '@/app/build-workers.mjs';

/** Worker threads run bundled files: they are built once before all tests. */
export default buildWorkers;
