/** `npm run bench`: builds the command line and the bench as they ship, optimised alike, and runs the bench. */
import { rmSync } from 'node:fs';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { build } from 'vite';

const root = fileURLToPath(new URL('..', import.meta.url));
process.chdir(root);
// Inside node_modules, so that the simulator, left out of the bundle, is found from there.
const outDir = fileURLToPath(new URL('../node_modules/.sealwright-bench/', import.meta.url));

await build({ configFile: 'vite.cli.config.ts', logLevel: 'error' });
await build({
  configFile: false,
  logLevel: 'error',
  resolve: { alias: { $lib: fileURLToPath(new URL('../src/lib', import.meta.url)) } },
  ssr: { noExternal: true, external: ['eecircuit-engine'], target: 'node' },
  build: {
    ssr: 'test/bench/bench.ts',
    outDir,
    emptyOutDir: true,
    minify: false,
    copyPublicDir: false,
    rollupOptions: { output: { entryFileNames: 'bench.mjs' } }
  }
});
try {
  await import(pathToFileURL(`${outDir}bench.mjs`).href);
} finally {
  rmSync(outDir, { recursive: true, force: true });
}
