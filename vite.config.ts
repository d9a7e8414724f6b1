import { sveltekit } from '@sveltejs/kit/vite';
import { svelteTesting } from '@testing-library/svelte/vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [sveltekit()],
  worker: { format: 'es' },
  // Fonts stay files of their own: the page's policy allows none from data: addresses.
  build: { assetsInlineLimit: 0 },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          environment: 'node',
          include: [
            'test/{engine,plan,words,shelf,cli,reference,laws,project}/**/*.test.ts',
            'test/charts/*.test.ts'
          ],
          testTimeout: 60_000,
          hookTimeout: 120_000
        }
      },
      {
        extends: true,
        plugins: [svelteTesting()],
        test: {
          name: 'screen',
          environment: 'happy-dom',
          include: ['test/workspace/**/*.test.ts', 'test/charts/ui/*.test.ts'],
          setupFiles: ['test/workspace/setup.ts']
        }
      }
    ]
  }
});
