import { once } from 'node:events';
import { readFile } from 'node:fs/promises';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { extname, join, normalize, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

const BUILD = fileURLToPath(new URL('../../build/', import.meta.url));

const TYPES: Record<string, string> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript',
  '.css': 'text/css',
  '.json': 'application/json',
  '.svg': 'image/svg+xml',
  '.woff': 'font/woff',
  '.woff2': 'font/woff2',
  '.webmanifest': 'application/manifest+json'
};

/**
 * The built app under a path such as `/some/where/`, as a plain static server of someone's own would have it.
 * Nothing outside that path is answered, so that an absolute address in the page shows as a 404.
 */
export async function serveUnder(base: string): Promise<{ address: string; close: () => Promise<void> }> {
  const server = createServer(async (request, response) => {
    const path = decodeURIComponent(new URL(request.url ?? '/', 'http://here').pathname);
    const inside = path.startsWith(base) ? normalize(path.slice(base.length)) : null;
    const file = join(
      BUILD,
      inside === null || inside === '.' || inside.endsWith(sep) ? join(inside ?? '', 'index.html') : inside
    );
    try {
      if (inside === null || !file.startsWith(BUILD)) throw new Error('outside');
      const body = await readFile(file);
      response
        .writeHead(200, { 'content-type': TYPES[extname(file)] ?? 'application/octet-stream' })
        .end(body);
    } catch {
      response.writeHead(404).end();
    }
  }).listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address() as AddressInfo;
  return {
    address: `http://127.0.0.1:${port}${base}`,
    close: async () => {
      server.closeAllConnections();
      server.close();
      await once(server, 'close');
    }
  };
}
