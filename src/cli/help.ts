/** What `--help` says. */

const PLAN = `PLAN is a plan file (NAME.sealwright.json), or - for standard input.`;

export const OVERVIEW = `sealwright: plans sealed subwoofers for one room, from a plan file.

Usage
  sealwright check PLAN... [--json]
  sealwright curves PLAN [--from 5 --to 500 --points 400] [--csv or --json]
  sealwright sweep PLAN --over volume, boost or level [--from --to --points] [--csv or --json]
  sealwright schema
  sealwright COMMAND --help
  sealwright --version

Commands
  check    the whole chain: verdict, alignment, limits, findings with ways out, ledger
  curves   level, phase, shaping, drive, impedance, travel and ceilings over frequency
  sweep    one of three decisions: how big a box, how much boost, how loud
  schema   the JSON Schema of a plan file

${PLAN}
Exit status: 0 every plan holds (for curves, sweep and schema: done); 1 a plan does not hold;
2 a plan cannot be read or the command was not understood.
`;

const CHECK = `sealwright check PLAN... [--json]

Judges each plan: verdict, alignment, limits, findings with ways out, and the ledger by
one-third octaves.

Options
  --json   one JSON object for one PLAN, an array for several
  --help   this text

${PLAN}
Exit status: 0 every plan holds; 1 a limit is over or a blocking finding stands;
2 a plan cannot be read or the command was not understood. The worst of several wins.
`;

const CURVES = `sealwright curves PLAN [--from HZ] [--to HZ] [--points N] [--csv or --json]

Prints the curves, one row a frequency, evenly spaced in octaves.

Options
  --from HZ    lowest frequency (5)
  --to HZ      highest frequency (500)
  --points N   how many, 2 to 10000 (400)
  --csv        comma-separated, empty where a value does not exist
  --json       {"rows": [...]}, null where a value does not exist
  --help       this text

${PLAN}
`;

const SWEEP = `sealwright sweep PLAN --over volume, boost or level [--from A] [--to B] [--points N] [--csv or --json]

Sweeps one decision and answers it.
  --over volume   how big a box? net volume in litres, by default 0.35 to 3 times the plan's
  --over boost    how much boost? the Linkwitz transform's to_Hz (10 Hz to fc or 40 Hz), else the
                  low shelf's gain_dB (0 to 18), else a trial transform
  --over level    how loud can it go? level in dB, by default 15 below the goal to 10 above

Options
  --from A     start, in the unit of what is swept
  --to B       end, above the start
  --points N   how many, 2 to 10000 (101)
  --csv        comma-separated rows, without the answers
  --json       answers and rows
  --help       this text

${PLAN}
`;

const SCHEMA = `sealwright schema

Prints the JSON Schema of a plan file. Rules across keys are checked by "sealwright check" alone.
`;

export const HELP: { readonly [command: string]: string } = {
  check: CHECK,
  curves: CURVES,
  sweep: SWEEP,
  schema: SCHEMA
};
