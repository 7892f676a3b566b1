// Three suites: unit (no I/O), contract (ports against fakes and real-shaped bodies), integration (real PostgreSQL).
import { defineConfig } from 'vitest/config'

export default defineConfig({
  resolve: { tsconfigPaths: true },
  test: {
    projects: [
      {
        extends: true,
        test: { name: 'unit', include: ['tests/unit/**/*.test.{ts,tsx}', 'tests/published/**/*.test.ts'] },
      },
      { extends: true, test: { name: 'contract', include: ['tests/contract/**/*.test.ts'], testTimeout: 20_000 } },
      {
        extends: true,
        test: {
          name: 'integration',
          include: ['tests/integration/**/*.test.ts'],
          globalSetup: 'tests/support/database-template.ts',
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
})
