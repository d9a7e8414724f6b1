/**
 * The account as it is shown: every figure rounded to tenths of a decibel, and still adding up as shown.
 * The opening and closing are rounded as they are; the residue goes, tenth by tenth, to the largest entries, where it shows least.
 */
import type { Account, Entry } from '$lib/engine/budget/account';

export interface AccountLine {
  readonly entry: Entry;
  /** dB as shown; one of the two is null. A gain of 0.0 is entered as a gain. */
  readonly loss: number | null;
  readonly gain: number | null;
  /** dB carried after this entry, as shown. */
  readonly level: number;
}

export interface AccountPage {
  readonly opening: number;
  readonly lines: readonly AccountLine[];
  readonly closing: number;
}

const tenths = (db: number): number => Math.round(db * 10);

export function accountPage(account: Account): AccountPage {
  const opening = tenths(account.opening);
  const closing = tenths(account.closing);
  const shown = account.entries.map((e) => tenths(e.db));
  let residue = closing - opening - shown.reduce((sum, x) => sum + x, 0);
  const bySize = account.entries
    .map((_, i) => i)
    .sort((a, b) => Math.abs(account.entries[b].db) - Math.abs(account.entries[a].db));
  for (let i = 0; residue !== 0; i = (i + 1) % bySize.length) {
    const step = Math.sign(residue);
    shown[bySize[i]] += step;
    residue -= step;
  }
  let level = opening;
  const lines = account.entries.map((entry, i): AccountLine => {
    level += shown[i];
    const db = shown[i] / 10;
    return { entry, loss: db < 0 ? -db : null, gain: db < 0 ? null : db, level: level / 10 };
  });
  return { opening: opening / 10, lines, closing: closing / 10 };
}
