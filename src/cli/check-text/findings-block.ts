import type { Finding, FindingCode, Severity, WayOut } from '$lib/engine/budget/budget';
import type { JsonPatchOperation } from '$lib/plan/json-patch';
import { toPatch } from '$lib/plan/to-patch';
import { findingText } from '$lib/words/findings/finding-words';
import { wayOutAct, wayOutText } from '$lib/words/ways-out';
import type { Ink } from '../colour';
import { fold, padEnd } from '../text-width';
import { block, type Page } from './page';

const GRAVEST_FIRST: readonly Severity[] = ['blocking', 'caution', 'note'];
/** "blocking" and two spaces. */
const INDENT = 12;

/** Blocking ones, cautions, notes; under each its ways out with the change to the file. One that was told is told shortly. */
export function findingsBlock(page: Page): string[] {
  const { findings } = page.budget;
  if (findings.length === 0) return block(page, 'Findings', ['  none']);
  const told = new Set<string>();
  const sorted = GRAVEST_FIRST.flatMap((severity) => findings.filter((f) => f.severity === severity));
  return block(
    page,
    'Findings',
    sorted.flatMap((finding) => findingLines(finding, page, told))
  );
}

function findingLines(finding: Finding, page: Page, told: Set<string>): string[] {
  const { ink, width } = page;
  const [first, ...rest] = fold(findingText(finding), width, ' '.repeat(INDENT));
  const tag = `  ${padEnd(paintSeverity(finding.severity, ink), INDENT - 2)}`;
  return [
    tag + first.slice(INDENT),
    ...rest,
    ...finding.waysOut.flatMap((way) => wayLines(way, finding.code, page, told))
  ];
}

function wayLines(way: WayOut, code: FindingCode, page: Page, told: Set<string>): string[] {
  const { plan, chain, ink, width } = page;
  const lead = ' '.repeat(INDENT);
  const patch = toPatch(plan, way.changes);
  const key = JSON.stringify(patch);
  const again = told.has(key);
  told.add(key);
  const text = again ? `${wayOutAct(way, chain.driver)}, as above.` : wayOutText(way, code, chain.driver);
  return [
    ...fold(text, width, `${lead}- `, `${lead}  `),
    ...(again
      ? []
      : patch.flatMap((op) => fold(patchText(op), width, `${lead}  `, `${lead}    `).map(ink.dim)))
  ];
}

/** "/goal/level_dB: 102.7"; a new entry says so. */
function patchText(change: JsonPatchOperation): string {
  if (change.op === 'remove') return `remove ${change.path}`;
  const text = JSON.stringify(change.value, null, 1).replace(/\n\s*/g, ' ');
  return `${change.op === 'add' ? 'add ' : ''}${change.path}: ${text}`;
}

function paintSeverity(severity: Severity, ink: Ink): string {
  return severity === 'blocking'
    ? ink.red(severity)
    : severity === 'caution'
      ? ink.amber(severity)
      : severity;
}
