import { readFileSync } from 'node:fs';
import { readPlan } from '$lib/plan/read-plan';
import { outline } from '$lib/shelf/summary';
import type { Example, ExampleCard } from '$lib/workspace/example';
import type { PageServerLoad } from './$types';

const read = (file: string) => readFileSync(`static/examples/${file}`, 'utf8');

/** Runs while the app is built: each example is worked through, so that its verdict is in the page itself. */
export const load: PageServerLoad = () => {
  const examples = JSON.parse(read('index.json')) as Example[];
  return { examples: examples.map(cardOf) };
};

function cardOf(example: Example): ExampleCard {
  const plan = readPlan(read(example.file));
  if (!plan.ok) throw new Error(`${example.file}: ${plan.problems[0].message}`);
  const { verdict, curve } = outline(plan.chain);
  if (verdict === null || curve === null) throw new Error(`${example.file} cannot be worked through`);
  // A tenth of a decibel is less than a pixel of the small curve.
  const levels = curve.delivered.map((level) => Math.round(level * 10) / 10);
  return { ...example, holds: verdict.holds, levels };
}
