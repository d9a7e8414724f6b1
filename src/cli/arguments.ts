/** Options and arguments of a command, by node's own parser; what is wrong becomes one line. */
import { parseArgs } from 'node:util';
import { plainText } from './plain-text';
import { UsageError } from './usage-error';

export interface OptionTypes {
  readonly [name: string]: 'boolean' | 'string';
}

type Values<T extends OptionTypes> = { [K in keyof T]?: T[K] extends 'boolean' ? boolean : string };

export interface Arguments<T extends OptionTypes> {
  readonly values: Values<T>;
  readonly plans: readonly string[];
}

export function readArguments<T extends OptionTypes>(
  command: string,
  args: readonly string[],
  types: T
): Arguments<T> {
  const options = Object.fromEntries(Object.entries(types).map(([name, type]) => [name, { type }]));
  try {
    const { values, positionals } = parseArgs({
      args: joinNegatives(args, types),
      options,
      allowPositionals: true,
      strict: true
    });
    return { values: values as Values<T>, plans: positionals };
  } catch (error) {
    if (error instanceof Error && 'code' in error && String(error.code).startsWith('ERR_PARSE_ARGS'))
      throw new UsageError(wording(error.message), command);
    throw error;
  }
}

/** `--from -12` means a negative number: node's parser wants it as `--from=-12`. */
function joinNegatives(args: readonly string[], types: OptionTypes): string[] {
  const joined: string[] = [];
  for (let i = 0; i < args.length; i++) {
    const takesValue = args[i].startsWith('--') && types[args[i].slice(2)] === 'string';
    if (args[i] === '--') return [...joined, ...args.slice(i)];
    if (takesValue && /^-\.?\d/.test(args[i + 1] ?? '')) joined.push(`${args[i]}=${args[++i]}`);
    else joined.push(args[i]);
  }
  return joined;
}

/** The parser's first sentence; its advice about its own syntax is left out. */
function wording(message: string): string {
  const first = plainText(message).split(/\. /)[0].replace(/\.$/, '');
  return first.charAt(0).toLowerCase() + first.slice(1);
}

/** A finite number, or bad usage. */
export function numberOption(command: string, name: string, text: string | undefined): number | undefined {
  if (text === undefined) return undefined;
  const value = text.trim() === '' ? NaN : Number(text);
  if (!Number.isFinite(value))
    throw new UsageError(`--${name} must be a number (got "${plainText(text)}")`, command);
  return value;
}

/** Whole points from 2 to 10 000, or bad usage. */
export function pointsOption(command: string, text: string | undefined): number | undefined {
  const points = numberOption(command, 'points', text);
  if (points !== undefined && !(Number.isInteger(points) && points >= 2 && points <= 10_000))
    throw new UsageError(`--points must be a whole number from 2 to 10000 (got ${points})`, command);
  return points;
}

/** The one PLAN of a command that takes one. */
export function onePlan(command: string, plans: readonly string[]): string {
  if (plans.length === 0)
    throw new UsageError(`${command} needs a PLAN: a file, or - for standard input`, command);
  if (plans.length > 1) throw new UsageError(`${command} takes one PLAN (got ${plans.length})`, command);
  return plans[0];
}
