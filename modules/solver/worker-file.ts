import { join } from 'node:path';

/** Where the bundle of a worker stands; `app/build-workers.mjs` puts it there. */
export const workerFile = (name: string): string =>
  join(process.cwd(), 'dist', 'workers', `${name}.mjs`);
