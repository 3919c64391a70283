import type { ViteUserConfig } from 'vitest/config';

const config: ViteUserConfig = {
  test: {
    include: ['test/**/*.deep.test.ts'],
    testTimeout: 900_000,
    maxWorkers: 2,
  },
};

export default config;
