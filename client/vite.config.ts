import react from '@vitejs/plugin-react'
import { defaultClientConditions } from 'vite'
import { defineConfig } from 'vitest/config'

export default defineConfig({
  plugins: [react()],
  resolve: { conditions: ['@wadestone/source', ...defaultClientConditions] },
  server: {
    host: '127.0.0.1',
    port: 5173,
    strictPort: true,
    proxy: { '/api': process.env.API_ADDRESS ?? 'http://127.0.0.1:3000' },
  },
  logLevel: 'warn',
  build: {
    chunkSizeWarningLimit: 600,
    target: 'es2022',
    // shared is pure, so what a page does not use of it is left out of its file.
    rolldownOptions: {
      treeshake: { moduleSideEffects: (id) => !id.includes('/shared/src/') },
      // A file of its own runs before the file with the schemas does.
      output: {
        codeSplitting: {
          groups: [{ name: 'zod-without-eval', test: /zod-without-eval|zod\/v4\/core\/core/ }],
        },
      },
    },
  },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.test.{ts,tsx}'],
    setupFiles: ['src/test-setup.ts'],
    passWithNoTests: false,
    maxWorkers: 2,
    // A form of many fields in a simulated browser takes seconds on a busy machine.
    testTimeout: 30_000,
  },
})
