import { readdirSync, readFileSync } from 'node:fs';
import type { PageServerLoad } from './$types';

/** The examples' names at build time: what `?example=` may ask for. */
export const load: PageServerLoad = () => {
  const folder = 'static/examples';
  const files = readdirSync(folder).filter((file) => file.endsWith('.sealwright.json'));
  return {
    examples: files,
    version: (JSON.parse(readFileSync('package.json', 'utf8')) as { version: string }).version
  };
};
