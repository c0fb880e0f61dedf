import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));
const alias = { '@': root.replace(/\/$/, '') };

/** One project for each part of `npm test`; `vitest run --project unit` runs one alone. */
function project(name: string, include: string[], options: object = {}) {
  return { resolve: { alias }, test: { name, include, environment: 'node', ...options } };
}

export default defineConfig({
  resolve: { alias },
  test: {
    passWithNoTests: true,
    // Parts run side by side and would write each other's.
    cache: false,
    projects: [
      project('unit', ['{app,components,db,lib,realtime,scripts}/**/*.test.{ts,tsx,mts}']),
      project('integration', ['tests/integration/**/*.test.ts'], {
        globalSetup: ['tests/support/database-server.ts'], testTimeout: 30_000, hookTimeout: 60_000,
      }),
      project('access', ['tests/access/**/*.test.ts'], {
        globalSetup: ['tests/support/database-server.ts'], testTimeout: 60_000, hookTimeout: 60_000,
      }),
      project('realtime', ['tests/realtime/**/*.test.ts'], { testTimeout: 120_000, hookTimeout: 60_000 }),
      project('reference', ['tests/reference/**/*.test.ts'], { testTimeout: 60_000, hookTimeout: 60_000 }),
      project('lifecycle', ['tests/lifecycle/**/*.test.ts'], { testTimeout: 400_000, hookTimeout: 400_000, fileParallelism: false }),
      project('repo', ['tests/repo/**/*.test.ts'], { testTimeout: 60_000 }),
    ],
  },
});
