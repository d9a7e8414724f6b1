import { sentence } from '$lib/words/sentence';
import { titleOf } from '$lib/words/title';
import { plainText } from '../plain-text';
import { fold } from '../text-width';
import type { Page } from './page';

/** Title and verdict; the first words carry the colour. */
export function verdictBlock({ plan, chain, budget, ink, width }: Page): string[] {
  const lines = fold(sentence(chain, budget), width);
  const opening = /^(Holds|Does not hold)/;
  const paint = budget.verdict.holds ? ink.green : ink.red;
  return [
    ...fold(plainText(titleOf(plan)), width).map(ink.bold),
    lines[0].replace(opening, (words) => paint(words)),
    ...lines.slice(1)
  ];
}
