/** `sealwright`: picks the command, gives it the streams, and turns trouble into one line and a status. */
import { fstatSync } from 'node:fs';
import { check } from './check';
import { inkFor } from './colour';
import { curves } from './curves';
import { HELP, OVERVIEW } from './help';
import { InputError } from './input-error';
import type { Command, ExitStatus, Io } from './io';
import { plainText } from './plain-text';
import { schema } from './schema';
import { sweep } from './sweep';
import { UsageError } from './usage-error';
import { writeOut } from './write-out';

const COMMANDS: { readonly [name: string]: Command } = { check, curves, sweep, schema };
const MOST_COLUMNS = 100;

/** Asked before `process.stdout` is touched, which loads all of node's streams. */
const onTerminal = fstatSync(1).isCharacterDevice() && process.stdout.isTTY === true;

const io: Io = {
  out: (text) => writeOut(1, text),
  err: (line) => writeOut(2, line + '\n'),
  ink: inkFor(onTerminal, process.env),
  width: onTerminal
    ? Math.max(60, Math.min(MOST_COLUMNS, process.stdout.columns || MOST_COLUMNS))
    : MOST_COLUMNS
};

async function run([name, ...args]: readonly string[]): Promise<ExitStatus> {
  if (name === undefined) throw new UsageError(`a command is needed: ${Object.keys(COMMANDS).join(', ')}`);
  if (name === '--help' || name === '-h' || name === 'help') {
    io.out(HELP[args[0]] ?? OVERVIEW);
    return 0;
  }
  if (name === '--version') {
    io.out(__VERSION__ + '\n');
    return 0;
  }
  if (!Object.hasOwn(COMMANDS, name))
    throw new UsageError(
      `unknown ${name.startsWith('-') ? 'option' : 'command'} "${plainText(name)}"; there are ${Object.keys(COMMANDS).join(', ')}`
    );
  const beforeEnd = args.includes('--') ? args.slice(0, args.indexOf('--')) : args;
  if (beforeEnd.includes('--help') || beforeEnd.includes('-h')) {
    io.out(HELP[name]);
    return 0;
  }
  return COMMANDS[name](args, io);
}

function report(error: unknown): ExitStatus {
  if (error instanceof InputError) error.lines.forEach(io.err);
  else if (error instanceof UsageError) {
    const command = error.command === null ? '' : ` ${error.command}`;
    io.err(`sealwright${command}: ${error.message} (see sealwright${command} --help)`);
  } else {
    io.err(
      `internal error: ${plainText(error instanceof Error ? error.message : String(error))}; please report it`
    );
    if (process.env.SEALWRIGHT_DEBUG && error instanceof Error) io.err(error.stack ?? '');
  }
  return 2;
}

process.exitCode = await run(process.argv.slice(2)).catch(report);
