import type { ViteUserConfig } from 'vitest/config';

const config: ViteUserConfig = {
  test: {
    include: ['test/**/*.test.ts'],
    exclude: ['test/**/*.deep.test.ts'],
    testTimeout: 60_000,
    maxWorkers: 2,
  },
};

export default config;
