import type { LimitMargin } from '$lib/engine/budget/budget';
import { apart } from '$lib/words/format-number';
import { capital, limitName, LIMIT_UNITS, listed } from '$lib/words/limit-names';
import { marginReading, marginSize } from '$lib/words/margin-text';
import { aboutHertzText } from '$lib/words/quantities';
import type { Ink } from '../colour';
import { tableLines } from '../table';
import { block, type Page } from './page';

/** Each limit at its own worst frequency: need, rating, margin, and how that reads. */
export function limitsBlock(page: Page): string[] {
  const { limits, notJudged } = page.budget;
  const rows = [['', 'needs', 'of', 'margin', '', 'at'], ...limits.map((l) => row(l, page.ink))];
  const lines = tableLines(rows, {
    align: ['left', 'right', 'right', 'right', 'left', 'right'],
    indent: '  '
  });
  if (notJudged.length > 0) lines.push(`  Not judged, rating missing: ${listed(notJudged.map(limitName))}`);
  return block(page, 'Limits', lines);
}

function row({ limit, demanded, allowed, margin, worst }: LimitMargin, ink: Ink): string[] {
  const { unit, factor } = LIMIT_UNITS[limit];
  const [need, rating] = apart(demanded * factor, allowed * factor);
  return [
    capital(limitName(limit)),
    `${need} ${unit}`,
    `${rating} ${unit}`,
    `${marginSize(margin)} dB`,
    paintReading(margin, ink),
    aboutHertzText(worst)
  ];
}

/** "over", "thin" or "in hand", in the colour of it. */
export function paintReading(margin: number, ink: Ink): string {
  const reading = marginReading(margin);
  return reading === 'over' ? ink.red(reading) : reading === 'thin' ? ink.amber(reading) : ink.green(reading);
}
