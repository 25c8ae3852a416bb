import { defineConfig } from 'vitest/config'

export default defineConfig({
  test: {
    include: ['src/**/*.test.ts'],
    passWithNoTests: false,
    maxWorkers: 2,
    testTimeout: 60_000,
  },
})
