import { defineConfig } from 'vitest/config'

export default defineConfig({
  test: {
    root: new URL('..', import.meta.url).pathname,
    include: ['test/**/*.test.ts'],
    benchmark: { include: ['test/bench/**/*.bench.ts'] },
    env: { TZ: 'UTC' },
    // The tests share nothing that one of them changes, and loading the modules afresh for each file takes longer than they do.
    isolate: false,
    testTimeout: 20_000,
  },
})
