import react from '@vitejs/plugin-react'
import { defineConfig } from 'vitest/config'

const browserCode = ['src/**/*.test.{ts,tsx}']

export default defineConfig({
  plugins: [react()],
  test: {
    maxWorkers: 2,
    testTimeout: 60_000,
    hookTimeout: 60_000,
    globalSetup: ['tests/support/global-setup.ts'],
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          environment: 'node',
          include: [
            'shared/**/*.test.ts',
            'server/**/*.test.ts',
            'scripts/**/*.test.ts',
            'tests/repo/**/*.test.ts',
          ],
        },
      },
      {
        extends: true,
        test: {
          name: 'component',
          environment: 'jsdom',
          testTimeout: 20_000,
          include: browserCode,
          setupFiles: ['tests/support/component-setup.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'api',
          environment: 'node',
          testTimeout: 120_000,
          hookTimeout: 300_000,
          include: ['tests/api/**/*.test.ts'],
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          environment: 'node',
          include: ['tests/e2e/**/*.test.ts'],
          testTimeout: 240_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
})
