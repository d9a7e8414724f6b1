/** The three decisions: how big a box, how much amplifier for the boost, how loud. Each is the whole chain again at every value. */
import type { Chain } from '../chain';
import { EngineError } from '../error';
import { linearGrid, logGrid } from '../quantity/grid';
import { bisect } from '../quantity/search';
import type { Block } from '../shaping/block';
import type { LimitMargin, LimitName } from './budget';
import { LARGEST_BOX, netVolumeChange, SMALLEST_BOX } from './box-setting';
import { applyChanges } from './change';
import { keyFigures } from './key-figures';
import { limitMargins } from './limit-margins';
import { LIMITS } from './limits/all-limits';
import type { Sweep, SweepRequest, SweepRow } from './sweep-types';
import { atLevel, withShaping, workOut, type Workings } from './workings';

const AMPLIFIER: readonly LimitName[] = ['amplifier-voltage', 'amplifier-current'];

/** One decision: what is swept over which range, and where its answer lies. */
interface Decision {
  readonly column: Sweep['column'];
  readonly block: number | null;
  readonly from: number;
  readonly to: number;
  readonly logarithmic: boolean;
  readonly at: (value: number) => Workings;
  /** The answer is the lowest value that holds, or the highest; rounded to whole `step`s to the safe side. */
  readonly answers: 'lowest' | 'highest';
  readonly step: number;
}

function overVolume(w: Workings): Decision {
  const { net } = w.alignment;
  return {
    column: 'net_L',
    block: null,
    from: Math.max(SMALLEST_BOX, 0.35 * net),
    to: Math.min(LARGEST_BOX, 3 * net),
    logarithmic: true,
    at: (value) => workOut(applyChanges(w.chain, [netVolumeChange(w.chain, value, w.driver.displacement)])),
    answers: 'lowest',
    // A box of a litre or two has no ten whole litres to choose from: tenths then.
    step: net < 4e-3 ? 1e-4 : 1e-3
  };
}

function overLevel(w: Workings): Decision {
  const { level } = w.chain.goal;
  return {
    column: 'level_dB',
    block: null,
    from: level - 15,
    to: level + 10,
    logarithmic: false,
    at: (value) => atLevel(w, value),
    answers: 'highest',
    step: 0.1
  };
}

const TRIAL_Q = 0.707;

function overBoost(w: Workings): Decision {
  const { shaping } = w.chain;
  const transform = shaping.findIndex((b) => b.kind === 'linkwitz-transform' && !b.bypass);
  const shelf = shaping.findIndex((b) => b.kind === 'low-shelf' && !b.bypass);
  const replaced = (index: number, block: Block) => shaping.map((b, i) => (i === index ? block : b));
  if (transform < 0 && shelf >= 0) {
    const block = shaping[shelf];
    return {
      column: 'boost_gain_dB',
      block: shelf,
      from: 0,
      to: 18,
      logarithmic: false,
      at: (gain) => withShaping(w, replaced(shelf, { ...block, gain } as Block)),
      answers: 'highest',
      step: 0.1
    };
  }
  const trial: Block = {
    kind: 'linkwitz-transform',
    from: 'box',
    fromQ: 'box',
    to: w.alignment.fc,
    toQ: TRIAL_Q,
    bypass: false,
    fixed: false
  };
  return {
    column: 'boost_to_Hz',
    block: transform < 0 ? null : transform,
    from: 10,
    to: Math.max(40, w.alignment.fc),
    logarithmic: true,
    at: (to) =>
      withShaping(
        w,
        transform < 0
          ? [...shaping, { ...trial, to }]
          : replaced(transform, { ...shaping[transform], to } as Block)
      ),
    answers: 'lowest',
    step: 0.5
  };
}

function decisionOf(w: Workings, over: SweepRequest['over']): Decision {
  if (over === 'volume') return overVolume(w);
  return over === 'boost' ? overBoost(w) : overLevel(w);
}

function rowOf(w: Workings, value: number): SweepRow {
  const { limits, verdict, demand, system } = keyFigures(w);
  return {
    value,
    qtc: w.alignment.qtc,
    fc: w.alignment.fc,
    alignmentF3: w.alignment.f3,
    systemF3: system.f3,
    shapingBoost: system.boost,
    ratedW: demand.ratedW,
    peakV: demand.peakV,
    peakA: demand.peakA,
    travel: demand.travel,
    margins: Object.fromEntries(
      LIMITS.map(({ name }) => [name, limits.find((l) => l.limit === name)?.margin ?? null])
    ) as SweepRow['margins'],
    limit: verdict.limit,
    worst: verdict.worst,
    holds: verdict.holds
  };
}

/** Rounded to whole steps on the safe side, clear of the noise of the last bit. */
function roundSafe(value: number, step: number, answers: Decision['answers']): number {
  const steps = value / step;
  const whole = answers === 'lowest' ? Math.ceil(steps - 1e-9) : Math.floor(steps + 1e-9);
  return Number((whole * step).toPrecision(12));
}

const meets = (limits: readonly LimitMargin[], names: readonly LimitName[] | null): boolean =>
  limits.every((l) => l.margin >= 0 || (names !== null && !names.includes(l.limit)));

function solve(d: Decision, rows: readonly SweepRow[], names: readonly LimitName[] | null): number | null {
  const passes = (row: SweepRow) =>
    LIMITS.every(({ name }) => (row.margins[name] ?? 0) >= 0 || (names !== null && !names.includes(name)));
  const ordered = d.answers === 'lowest' ? rows : [...rows].reverse();
  const first = ordered.findIndex(passes);
  if (first < 0) return null;
  const holdsAt = (value: number) => {
    const w = d.at(value);
    return meets(limitMargins(w, { from: w.chain.programme.lowest }), names);
  };
  let value = ordered[first].value;
  if (first > 0) value = bisect(holdsAt, ordered[first - 1].value, value, d.step * 1e-3);
  return settleAnswer(d, rows, value, holdsAt);
}

/** `value` rounded to the safe side, inside the swept range, and seen to hold; null where rounding leaves the range. */
function settleAnswer(
  d: Decision,
  rows: readonly SweepRow[],
  value: number,
  holdsAt: (value: number) => boolean
): number | null {
  const { step } = d;
  const [low, high] = [rows[0].value - 1e-12, rows[rows.length - 1].value + 1e-12];
  const towards = d.answers === 'lowest' ? step : -step;
  const inside = (v: number) => v >= low && v <= high;
  const moved = (v: number, by: number) => Number((v + by).toPrecision(12));
  let rounded = roundSafe(value, step, d.answers);
  for (let tries = 0; tries < 12 && inside(rounded); tries++) {
    if (holdsAt(rounded)) {
      // The edge may lie a hair past a whole step: then that step is the answer.
      const better = moved(rounded, -towards);
      return inside(better) && holdsAt(better) ? better : rounded;
    }
    rounded = moved(rounded, towards);
  }
  return null;
}

/** Throws `EngineError` for a range that does not run upward or a number of points outside 2…10 000. */
export function sweep(chain: Chain, request: SweepRequest): Sweep {
  const w = workOut(chain);
  const d = decisionOf(w, request.over);
  const from = request.from ?? d.from;
  const to = request.to ?? d.to;
  const points = request.points ?? 101;
  if (!(points >= 2 && points <= 10_000 && Number.isInteger(points)))
    throw new EngineError(`points must be a whole number from 2 to 10000 (got ${points})`);
  if (!(from < to)) throw new EngineError(`a sweep needs from < to (got ${from} to ${to})`);
  if (d.logarithmic && !(from > 0)) throw new EngineError(`the swept value must be > 0 (got ${from})`);
  const grid = d.logarithmic ? logGrid(from, to, points) : linearGrid(from, to, points);
  const rows = Array.from(grid, (value) => rowOf(d.at(value), value));
  return {
    over: request.over,
    column: d.column,
    block: d.block,
    rows,
    answer: solve(d, rows, null),
    amplifierAnswer: solve(d, rows, AMPLIFIER)
  };
}
