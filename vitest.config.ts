import { readFileSync } from 'node:fs';
import { defineConfig } from 'vitest/config';

const { version } = JSON.parse(readFileSync(new URL('package.json', import.meta.url), 'utf8')) as {
  readonly version: string;
};

export default defineConfig({
  // What the bundle is given by esbuild; the version stands in package.json alone.
  define: { COUPLET_VERSION: JSON.stringify(version) },
  test: {
    include: ['test/**/*.test.ts'],
    testTimeout: 60_000,
    // Nothing here keeps state between tests or stubs a module: loading it once a worker halves the time of a run.
    pool: 'threads',
    isolate: false,
    coverage: { provider: 'v8', include: ['src/**/*.ts'], exclude: ['src/**/generated/**'] },
    benchmark: { include: ['test/bench/**/*.bench.ts'] },
  },
});
