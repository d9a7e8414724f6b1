import { fileURLToPath } from 'node:url';
import { readFileSync } from 'node:fs';
import { defineConfig } from 'vite';

const version = (
  JSON.parse(readFileSync(new URL('./package.json', import.meta.url), 'utf8')) as { version: string }
).version;

/** The command line as one self-contained ES module, built by the same tool as the app. */
export default defineConfig({
  define: { __VERSION__: JSON.stringify(version) },
  resolve: { alias: { $lib: fileURLToPath(new URL('./src/lib', import.meta.url)) } },
  ssr: { noExternal: true, target: 'node' },
  build: {
    ssr: 'src/cli/main.ts',
    outDir: 'dist',
    emptyOutDir: true,
    target: 'node20',
    minify: false,
    copyPublicDir: false,
    rollupOptions: {
      output: { entryFileNames: 'cli.js', banner: '#!/usr/bin/env node', codeSplitting: false }
    }
  }
});
