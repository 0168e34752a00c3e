import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  oxc: { jsx: { runtime: 'automatic' } },
  resolve: { alias: { '@': fileURLToPath(new URL('.', import.meta.url)) } },
  test: {
    include: ['tests/**/*.test.{ts,tsx}'],
    globalSetup: ['tests/support/build-workers.ts'],
    setupFiles: ['tests/support/no-stray-errors.ts'],
    maxWorkers: 2,
    testTimeout: 60_000,
    hookTimeout: 60_000,
    env: { LOG_LEVEL: 'silent', NEXTAUTH_SECRET: 'only-for-tests', MAIL_FOLDER: 'var/test-mail' },
  },
});
