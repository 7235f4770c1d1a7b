import { defineConfig } from 'vitest/config'

export default defineConfig({
  test: {
    root: new URL('..', import.meta.url).pathname,
    include: ['test/**/*.test.ts'],
    benchmark: { include: ['test/bench/**/*.bench.ts'] },
    env: { TZ: 'UTC' },
    testTimeout: 20_000,
  },
})
