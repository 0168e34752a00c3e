/* Serves the product for the browser tests from an empty database: the demo organisation, a pinned clock. */
import { rmSync } from 'node:fs';

rmSync('var/browser-test', { recursive: true, force: true });
await import('../../app/serve.mjs');
