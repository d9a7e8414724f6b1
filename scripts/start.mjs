/**
 * Builds the app and serves it from this machine alone, until Ctrl-C.
 * `--no-build` serves what is built already; `--port N` insists on a port, else 4173 or the next free one is taken.
 */
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import process from 'node:process';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';

const ROOT = fileURLToPath(new URL('..', import.meta.url));
const FIRST_PORT = 4173;

/** What the build has to say is told only when it fails. */
function buildApp() {
  console.log('Building Sealwright …');
  const vite = fileURLToPath(new URL('../node_modules/vite/bin/vite.js', import.meta.url));
  if (!existsSync(vite)) throw new Error('The parts that build the app are missing. Run "npm ci" first.');
  const { status, stdout, stderr } = spawnSync(process.execPath, [vite, 'build', '--logLevel', 'error'], {
    cwd: ROOT,
    encoding: 'utf8'
  });
  if (status === 0) return;
  process.stderr.write(stdout + stderr);
  throw new Error('The app could not be built. Run "npm ci" again; "npm run check" tells more.');
}

/** Plain static files: what is served is exactly what any other static server would serve. */
async function serve(port) {
  const { preview } = await import('vite');
  const server = await preview({
    root: ROOT,
    configFile: false,
    logLevel: 'error',
    appType: 'mpa',
    build: { outDir: 'build' },
    preview: { host: '127.0.0.1', port: port ?? FIRST_PORT, strictPort: port !== undefined, open: false }
  });
  const stop = () => server.close().finally(() => process.exit(0));
  process.once('SIGINT', stop);
  process.once('SIGTERM', stop);
  return server.resolvedUrls?.local[0] ?? `http://127.0.0.1:${port ?? FIRST_PORT}/`;
}

try {
  const { values } = parseArgs({ options: { 'no-build': { type: 'boolean' }, port: { type: 'string' } } });
  if (!values['no-build']) buildApp();
  if (!existsSync(new URL('../build/index.html', import.meta.url))) {
    throw new Error('There is no build to serve. Run "npm run build" first.');
  }
  const address = await serve(values.port === undefined ? undefined : Number(values.port));
  console.log(`Sealwright is at ${address}  (Ctrl-C ends it)`);
} catch (trouble) {
  console.error(trouble instanceof Error ? trouble.message : String(trouble));
  process.exit(1);
}
