import { readFileSync } from 'node:fs';
import type { Example } from '$lib/workspace/example';
import type { PageServerLoad } from './$types';

const read = (file: string) => readFileSync(`static/examples/${file}`, 'utf8');

/** Runs while the app is built: the first example is in the page itself, the others are fetched when they are chosen. */
export const load: PageServerLoad = () => {
  const examples = JSON.parse(read('index.json')) as Example[];
  return { examples, firstText: read(examples[0].file) };
};
