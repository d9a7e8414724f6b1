/** Filter blocks: numbers 55–64 of the published checks. */
import type { Block } from '$lib/engine/shaping/block';
import { cascadePhase, cascadePower } from '$lib/engine/shaping/cascade';
import { absolute, angle } from '../../tolerance';
import { one, rowsOf, type CheckRow } from './check-row';
import { cascade, db, degrees, KINDS, passBlock, PLAIN, ZERO_HZ } from './filter-response';

const LINKWITZ_1976 = 'S. Linkwitz, Active Crossover Networks for Noncoincident Drivers, JAES 24(1), 1976';
const LINKWITZ_1978 = 'S. Linkwitz, Loudspeaker System Design, Wireless World, 1978';
const COOKBOOK = 'Audio EQ Cookbook, W3C Working Group Note, 2021 (R. Bristow-Johnson; from memory)';
const SHELF = 'derived form (s+ω√g)/(s+ω/√g)';
const CIRCUIT = 'circuit theory';
const PRACTICE = 'common practice, checkable by hand';

const FAR = 1e9;
const NANO = absolute(1e-9);

/** dB of low plus high, as complex numbers, the high side turned over where wanted. */
function sumOfSides(order: number, f: number): number {
  const low = passBlock('low-pass', 'linkwitz-riley', order, 80);
  const high = passBlock('high-pass', 'linkwitz-riley', order, 80);
  const sides: Block[][] = [[low], order % 4 === 0 ? [high] : [high, { kind: 'polarity', ...PLAIN }]];
  let re = 0;
  let im = 0;
  for (const blocks of sides) {
    const size = Math.sqrt(cascadePower(cascade(...blocks), f));
    const turn = cascadePhase(cascade(...blocks), f);
    re += size * Math.cos(turn);
    im += size * Math.sin(turn);
  }
  return 20 * Math.log10(Math.hypot(re, im));
}

/** What the page prints as −6.0206 dB. */
const HALF_PRESSURE = 20 * Math.log10(1 / 2);

const linkwitzRiley = [2, 4, 6, 8].flatMap((order) => [
  ...KINDS.map((kind) =>
    one(
      55,
      `Linkwitz–Riley ${kind} order ${order} at the corner, dB`,
      HALF_PRESSURE,
      absolute(1e-6),
      LINKWITZ_1976,
      () => db(80, passBlock(kind, 'linkwitz-riley', order, 80))
    )
  ),
  ...[10, 40, 79, 80, 113, 400].map((f) =>
    one(56, `Linkwitz–Riley order ${order}, low plus high at ${f} Hz, dB`, 0, NANO, LINKWITZ_1976, () =>
      sumOfSides(order, f)
    )
  )
]);

const transform: Block = { kind: 'linkwitz-transform', from: 40, fromQ: 0.9, to: 20, toQ: 0.7, ...PLAIN };
/** A second-order high-pass of any Q, as a bare section. */
const highPass = (f0: number, q: number): Block => ({
  kind: 'section',
  b: [1, 0, 0],
  a: [1, f0 / q, f0 * f0],
  ...PLAIN
});

const transforms = [
  ...rowsOf<number>(
    {
      number: 57,
      what: 'Linkwitz transform 40 Hz/0.9 to 20 Hz/0.7, dB, at Hz',
      tolerance: absolute(0.001),
      source: LINKWITZ_1978
    },
    [
      [ZERO_HZ, 12.0412],
      [5, 11.9621],
      [10, 11.5413],
      [20, 8.3441],
      [30, 3.623],
      [40, 0.6104],
      [80, -0.6271]
    ],
    (f) => db(f, transform)
  ),
  ...[5, 20, 40, 120].flatMap((f) => [
    one(58, `… on a high-pass 40 Hz/0.9, re one of 20 Hz/0.7, dB at ${f} Hz`, 0, NANO, LINKWITZ_1978, () => {
      return db(f, highPass(40, 0.9), transform) - db(f, highPass(20, 0.7));
    }),
    one(58, `… and its phase, degrees at ${f} Hz`, 0, angle(1e-9), LINKWITZ_1978, () => {
      return degrees(f, highPass(40, 0.9), transform) - degrees(f, highPass(20, 0.7));
    })
  ])
];

const shelf = (order: 1 | 2, gain: number, q = Math.SQRT1_2): Block => ({
  kind: 'low-shelf',
  order,
  corner: 40,
  gain,
  q,
  ...PLAIN
});
const peak = (gain: number): Block => ({ kind: 'peak', centre: 40, q: 4, gain, ...PLAIN });

const shelvesAndPeaks = [9, -5].flatMap((gain) => [
  one(59, `peak of ${gain} dB at its centre`, gain, NANO, COOKBOOK, () => db(40, peak(gain))),
  one(59, `peak of ${gain} dB at 0 Hz`, 0, NANO, COOKBOOK, () => db(ZERO_HZ, peak(gain))),
  one(59, `peak of ${gain} dB far above`, 0, NANO, COOKBOOK, () => db(FAR, peak(gain))),
  ...[Math.SQRT1_2, 1.3].flatMap((q) => [
    one(59, `second-order shelf of ${gain} dB, Q ${q.toFixed(2)}, at 0 Hz`, gain, NANO, COOKBOOK, () =>
      db(ZERO_HZ, shelf(2, gain, q))
    ),
    one(
      59,
      `second-order shelf of ${gain} dB, Q ${q.toFixed(2)}, at the corner`,
      gain / 2,
      NANO,
      COOKBOOK,
      () => db(40, shelf(2, gain, q))
    ),
    one(59, `second-order shelf of ${gain} dB, Q ${q.toFixed(2)}, far above`, 0, NANO, COOKBOOK, () =>
      db(FAR, shelf(2, gain, q))
    )
  ]),
  one(60, `first-order shelf of ${gain} dB at 0 Hz`, gain, NANO, SHELF, () => db(ZERO_HZ, shelf(1, gain))),
  one(60, `first-order shelf of ${gain} dB at the corner`, gain / 2, NANO, SHELF, () =>
    db(40, shelf(1, gain))
  ),
  one(60, `first-order shelf of ${gain} dB far above`, 0, NANO, SHELF, () => db(FAR, shelf(1, gain))),
  one(60, `first-order shelf of ${gain} dB after its opposite, dB at 33 Hz`, 0, NANO, SHELF, () => {
    return db(33, shelf(1, gain), shelf(1, -gain));
  }),
  one(
    60,
    `first-order shelf of ${gain} dB after its opposite, degrees at 33 Hz`,
    0,
    angle(1e-9),
    SHELF,
    () => {
      return degrees(33, shelf(1, gain), shelf(1, -gain));
    }
  )
]);

const allPass = (order: 1 | 2): Block => ({ kind: 'all-pass', order, corner: 60, q: 0.7, ...PLAIN });
const allPasses = ([1, 2] as const).flatMap((order) => [
  one(61, `all-pass order ${order} at its corner, degrees`, -90 * order, angle(1e-9), CIRCUIT, () =>
    degrees(60, allPass(order))
  ),
  ...[5, 60, 300].map((f) =>
    one(61, `all-pass order ${order} at ${f} Hz, dB`, 0, NANO, CIRCUIT, () => db(f, allPass(order)))
  )
]);

const gentle: Block[] = [
  passBlock('low-pass', 'butterworth', 2, 75),
  passBlock('low-pass', 'butterworth', 1, 40),
  { kind: 'gain', gain: 20 * Math.log10(2), ...PLAIN }
];

export const filters: readonly CheckRow[] = [
  ...linkwitzRiley,
  ...transforms,
  ...shelvesAndPeaks,
  ...allPasses,
  one(62, 'gain of two equal resistors, dB', 6.0206, absolute(1e-4), 'common practice: 1 + R/R', () =>
    db(50, gentle[2])
  ),
  ...rowsOf<number>(
    {
      number: 63,
      what: 'Butterworth order 2 at 75 Hz, then order 1 at 40 Hz, gain 2: dB at Hz',
      tolerance: absolute(0.001),
      source: PRACTICE
    },
    [
      [10, 5.756],
      [20, 5.03],
      [30, 3.973],
      [40, 2.672],
      [50, 1.151],
      [60, -0.589],
      [75, -3.537],
      [80, -4.576]
    ],
    (f) => db(f, ...gentle)
  ),
  ...rowsOf<number>(
    {
      number: 64,
      what: 'input capacitor 3 dB down at 7 Hz, dB at Hz',
      tolerance: absolute(0.001),
      source: 'common practice; C = 1/(2πfR)'
    },
    [
      [3.5, -6.99],
      [7, -3.01],
      [10, -1.732],
      [14, -0.969],
      [20, -0.502],
      [40, -0.131]
    ],
    (f) => db(f, passBlock('high-pass', 'butterworth', 1, 7))
  )
];
