import { defineConfig } from 'vitest/config';

const project = (name: string, timeout = 20_000) => ({
  test: { name, include: [`tests/${name}/**/*.test.{ts,tsx}`], testTimeout: timeout, hookTimeout: 60_000 },
});

export default defineConfig({
  test: {
    projects: [
      project('unit'),
      project('reference'),
      project('rules'),
      project('api'),
      project('isolation', 120_000),
      project('ports'),
      project('torture', 300_000),
      project('browser', 180_000),
    ],
  },
});
