/** Format and version of a file, and the steps that bring an older version up to this one. */
import { problem, type Problem } from './problem';
import { showValue } from './show-value';
import { FORMAT, VERSION } from './version';

/** One step from a version to a later one. `apply` takes a copy of the file's object, not yet checked, and gives the new one. */
export interface Migration {
  readonly from: number;
  readonly to: number;
  readonly apply: (value: Record<string, unknown>) => Record<string, unknown>;
}

/** Version 1 is the first: nothing is older. */
export const MIGRATIONS: readonly Migration[] = [];

export type MigrationResult = { ok: true; value: unknown } | { ok: false; problems: Problem[] };

/** The file's object as this version has it, or the one problem with its format or version. */
export function migrate(value: unknown, migrations: readonly Migration[] = MIGRATIONS): MigrationResult {
  if (typeof value !== 'object' || value === null || Array.isArray(value))
    return refuse('', showValue(value), 'an object', `a plan is an object { … }, not ${showValue(value)}.`);
  let plan = value as Record<string, unknown>;
  const format = own(plan, 'format');
  if (format !== FORMAT)
    return refuse(
      '/format',
      shown(format),
      JSON.stringify(FORMAT),
      format === undefined
        ? `missing: a plan file says "${FORMAT}".`
        : `${shown(format)} is not the format of a plan file, "${FORMAT}".`
    );
  for (;;) {
    const version = own(plan, 'version');
    const wrong = versionProblem(version);
    if (wrong !== null) return { ok: false, problems: [wrong] };
    if (version === VERSION) return { ok: true, value: plan };
    const step = migrations.find((m) => m.from === version && m.to > m.from && m.to <= VERSION);
    if (step === undefined)
      return refuse(
        '/version',
        shown(version),
        String(VERSION),
        `version ${shown(version)} is not known: this Sealwright reads version ${VERSION}.`
      );
    plan = { ...step.apply(structuredClone(plan)), version: step.to };
  }
}

function versionProblem(version: unknown): Problem | null {
  const say = (message: string) =>
    problem({ path: '/version', found: shown(version), allowed: String(VERSION), message });
  if (version === undefined) return say(`missing: this Sealwright reads version ${VERSION}.`);
  if (typeof version !== 'number' || !Number.isInteger(version))
    return say(`${shown(version)} is not a version: this Sealwright reads version ${VERSION}.`);
  if (version > VERSION)
    return say(
      `the file has version ${version}, this Sealwright reads version ${VERSION}: it needs a newer Sealwright.`
    );
  return null;
}

const own = (object: Record<string, unknown>, key: string): unknown =>
  Object.hasOwn(object, key) ? object[key] : undefined;

const shown = (value: unknown): string => (value === undefined ? 'nothing' : showValue(value));

const refuse = (path: string, found: string, allowed: string, message: string): MigrationResult => ({
  ok: false,
  problems: [problem({ path, found, allowed, message })]
});
