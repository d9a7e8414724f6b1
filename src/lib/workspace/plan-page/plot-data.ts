/** The curves of the open plan as the charts draw them. Only shapes and names here: every figure comes from the engine. */
import type { Curves, LimitName } from '$lib/engine/budget/budget';
import type { Chain } from '$lib/engine/chain';
import type { Curve, Limit, Region } from '$lib/charts/plot-types';
import { limitName, shortLimitName } from '$lib/words/limit-names';

const TONES: { readonly [L in LimitName]: Limit } = {
  'amplifier-voltage': 'volts',
  'amplifier-current': 'amps',
  'cone-travel': 'travel',
  'mechanical-stop': 'stop',
  'coil-heat': 'heat'
};

/** Where each ceiling's name would rather stand, Hz. */
const NEAR: { readonly [L in LimitName]: number } = {
  'amplifier-voltage': 120,
  'amplifier-current': 150,
  'cone-travel': 14,
  'mechanical-stop': 18,
  'coil-heat': 30
};

const LIMIT_NAMES = Object.keys(TONES) as LimitName[];

/** Lowest of the ceilings at each frequency. */
export function lowestCeiling({ f, ceilings }: Curves): Float64Array {
  const lowest = new Float64Array(f.length).fill(Infinity);
  for (const name of LIMIT_NAMES) {
    const ceiling = ceilings[name];
    if (ceiling) for (let i = 0; i < f.length; i++) lowest[i] = Math.min(lowest[i], ceiling[i]);
  }
  return lowest;
}

export function levelCurves(chain: Chain, now: Curves, held: Curves | null): Curve[] {
  const { f } = now;
  const before: Curve[] =
    held === null
      ? []
      : [{ id: 'before', label: 'before', tone: 'ghost', x: held.f, y: held.delivered, dot: false }];
  const ceilings = LIMIT_NAMES.flatMap((name): Curve[] => {
    const y = now.ceilings[name];
    return y === null
      ? []
      : [
          {
            id: name,
            label: limitName(name),
            shortLabel: shortLimitName(name),
            tone: TONES[name],
            x: f,
            y,
            near: NEAR[name]
          }
        ];
  });
  return [
    ...before,
    ...ceilings,
    {
      id: 'wanted',
      label: `wanted ${chain.goal.level}`,
      tone: 'wanted',
      x: f,
      y: now.wanted,
      near: chain.goal.to,
      dot: false
    },
    { id: 'played', label: 'at the seat', tone: 'played', x: f, y: now.delivered, near: 90 }
  ];
}

/** Out of bounds above the lowest ceiling; over where the level at the seat goes beyond it, from the programme's lowest note up. */
export function levelRegions(chain: Chain, now: Curves): Region[] {
  const { f, delivered } = now;
  const lowest = lowestCeiling(now);
  const over = f.map((hz, i) => (hz >= chain.programme.lowest ? delivered[i] : NaN));
  return [
    {
      id: 'out',
      label: 'out of bounds above the lowest ceiling',
      shortLabel: 'out of bounds',
      tone: 'out',
      x: f,
      from: lowest,
      to: 'top'
    },
    { id: 'over', tone: 'over', x: f, from: lowest, to: over }
  ];
}

/** The value at the cursor, between the points of a curve (linear in log f). */
export function at(x: Float64Array, y: Float64Array, f: number): number {
  let high = x.findIndex((value) => value >= f);
  if (high < 0) high = x.length - 1;
  if (high === 0) return y[0];
  const share = Math.log(f / x[high - 1]) / Math.log(x[high] / x[high - 1]);
  return y[high - 1] + share * (y[high] - y[high - 1]);
}

export const millimetres = (metres: Float64Array): Float64Array => metres.map((m) => m * 1000);

export { TONES };
