/** The report of `check` for a person: within 100 columns, the verdict first, what it rests on below. */
import type { Exposure } from '$lib/engine/budget/budget';
import { cautions } from '$lib/words/cautions';
import { goalNote } from '$lib/words/goal-note';
import type { Ink } from '../colour';
import { fold } from '../text-width';
import { alignmentBlock } from './alignment-block';
import { findingsBlock } from './findings-block';
import { ledgerBlock } from './ledger-block';
import { levelBlock } from './level-block';
import { limitsBlock } from './limits-block';
import type { Page } from './page';
import { verdictBlock } from './verdict-block';

export function checkText(page: Page): string {
  return [verdictBlock, alignmentBlock, limitsBlock, levelBlock, findingsBlock, ledgerBlock, goalNoteBlock]
    .map((part) =>
      part(page)
        .map((line) => line + '\n')
        .join('')
    )
    .join('\n');
}

const goalNoteBlock = ({ chain, ink, width }: Page): string[] =>
  fold(goalNote(chain.goal.level), width).map(ink.dim);

/** What every report says once, at its end. */
export function cautionsText(exposure: Exposure, ink: Ink, width: number): string {
  const lines = cautions(exposure).flatMap((text) => fold(text, width, '  ', '    '));
  return ['', ink.bold('What this program cannot judge'), ...lines].map((line) => line + '\n').join('');
}
