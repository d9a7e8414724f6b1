import { readFileSync } from 'node:fs';
import { execFileSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const path = (file: string) => fileURLToPath(new URL(`../../${file}`, import.meta.url));

export interface ExampleEntry {
  file: string;
  title: string;
  about: string;
}

/** The examples that ship with the app, in the order of the list on screen. */
export const EXAMPLES = JSON.parse(
  readFileSync(path('static/examples/index.json'), 'utf8')
) as ExampleEntry[];

export const exampleText = (file: string): string => readFileSync(path(`static/examples/${file}`), 'utf8');

/** The part of `check --json` that the page is held against. */
export interface Checked {
  title: string;
  holds: boolean;
  sentence: string;
  alignment: { qtc: number; fc_Hz: number };
  findings: { text: string; ways_out: { text: string }[] }[];
  ledger: { nominal_Hz: number; delivered_dB: number; margin_dB: number | null }[];
  cautions: string[];
}

const known = new Map<string, Checked>();

/** What the built command line says of a plan: the other way to the same engine. */
export function checked(text: string): Checked {
  const report = known.get(text) ?? check(text);
  known.set(text, report);
  return report;
}

function check(text: string): Checked {
  try {
    return JSON.parse(
      execFileSync(process.execPath, [path('dist/cli.js'), 'check', '-', '--json'], options(text))
    ) as Checked;
  } catch (trouble) {
    // Status 1 is a plan that does not hold: its report is on standard output all the same.
    const { status, stdout } = trouble as { status: number; stdout: string };
    if (status !== 1) throw trouble;
    return JSON.parse(stdout) as Checked;
  }
}

const options = (input: string) => ({
  input,
  encoding: 'utf8' as const,
  stdio: ['pipe', 'pipe', 'pipe'] as ['pipe', 'pipe', 'pipe']
});
