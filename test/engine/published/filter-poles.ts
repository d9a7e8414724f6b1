/** Filter families: numbers 47–54 of the published checks. */
import { cascadeGroupDelay } from '$lib/engine/shaping/cascade';
import { bessel, butterworth } from '$lib/engine/shaping/families';
import { absolute, angle } from '../../tolerance';
import { one, rowsOf, type CheckRow } from './check-row';
import { cascade, db, degrees, KINDS, passBlock, ZERO_HZ } from './filter-response';

const BUTTERWORTH = 'S. Butterworth, On the Theory of Filter Amplifiers, Experimental Wireless, 1930';
const THOMSON =
  'W. E. Thomson, Delay networks having maximally flat frequency characteristics, Proc. IEE, 1949; reverse Bessel polynomials';
const ORDERS = [1, 2, 3, 4, 5, 6, 7, 8];

/** What the page prints as −3.0103 dB. */
const HALF_POWER = 10 * Math.log10(1 / 2);

const corners = ORDERS.flatMap((order) =>
  KINDS.map((kind) =>
    one(
      47,
      `Butterworth ${kind} order ${order} at the corner, dB`,
      HALF_POWER,
      absolute(1e-6),
      BUTTERWORTH,
      () => db(60, passBlock(kind, 'butterworth', order, 60))
    )
  )
);

const BUTTERWORTH_Q: readonly [number: number, order: number, q: number[]][] = [
  [48, 2, [0.70711]],
  [48, 3, [1]],
  [48, 4, [0.5412, 1.30656]],
  [49, 5, [0.61803, 1.61803]],
  [49, 6, [0.51764, 0.70711, 1.93185]],
  [49, 7, [0.55496, 0.80194, 2.24698]],
  [49, 8, [0.5098, 0.60134, 0.89998, 2.56292]]
];
const ascending = (a: number, b: number): number => a - b;
const butterworthQ = BUTTERWORTH_Q.flatMap(([number, order, due]) => {
  const found = butterworth(order)
    .flatMap((p) => (p.q === null ? [] : [p.q]))
    .sort(ascending);
  return [
    ...due.map((q, i) =>
      one(number, `Butterworth order ${order}, Q ${i + 1}`, q, absolute(1e-5), BUTTERWORTH, () => found[i])
    ),
    one(number, `Butterworth order ${order}, real poles`, order % 2, absolute(0), BUTTERWORTH, () => {
      return butterworth(order).filter((p) => p.q === null && p.ratio === 1).length;
    })
  ];
});

/** A real pole has Q null here as in the engine. */
const BESSEL_POLES: readonly [number: number, order: number, poles: [f: number, q: number | null][]][] = [
  [53, 2, [[1.27202, 0.57735]]],
  [
    53,
    3,
    [
      [1.32268, null],
      [1.44762, 0.69105]
    ]
  ],
  [
    53,
    4,
    [
      [1.43017, 0.52193],
      [1.60336, 0.80554]
    ]
  ],
  [
    54,
    6,
    [
      [1.60392, 0.51032],
      [1.68917, 0.61119],
      [1.90471, 1.02331]
    ]
  ],
  [
    54,
    8,
    [
      [1.77847, 0.50599],
      [1.83209, 0.55961],
      [1.9532, 0.71085],
      [2.18873, 1.22567]
    ]
  ]
];
const besselPoles = BESSEL_POLES.flatMap(([number, order, due]) =>
  due.flatMap(([f, q], i) => {
    const pole = [...bessel(order)].sort((a, b) => a.ratio - b.ratio)[i];
    const name = `Bessel order ${order}, pole ${i + 1}`;
    const place = one(number, `${name}, f re corner`, f, absolute(1e-5), THOMSON, () => pole.ratio);
    if (q === null)
      return [place, one(number, `${name} is real`, 1, absolute(0), THOMSON, () => Number(pole.q === null))];
    return [place, one(number, `${name}, Q`, q, absolute(1e-5), THOMSON, () => pole.q ?? NaN)];
  })
);

/** The corner of the delay-normalised form is the delay at 0 Hz times the angular corner frequency. */
const besselCorners = rowsOf<number>(
  {
    number: 52,
    what: 'Bessel −3 dB point of the delay-normalised form, rad/s, order',
    tolerance: absolute(1e-6),
    source: THOMSON
  },
  [
    [1, 1],
    [2, 1.361654],
    [3, 1.755672],
    [4, 2.113918],
    [5, 2.427411],
    [6, 2.703395],
    [7, 2.951722],
    [8, 3.179617]
  ],
  (order) =>
    cascadeGroupDelay(cascade(passBlock('low-pass', 'bessel', order, 60)), ZERO_HZ) * 2 * Math.PI * 60
);

export const filterPoles: readonly CheckRow[] = [
  ...corners,
  ...butterworthQ,
  ...ORDERS.map((order) =>
    one(
      50,
      `lag of a Butterworth low-pass of order ${order} at its corner, degrees`,
      -45 * order,
      angle(1e-6),
      BUTTERWORTH,
      () => degrees(60, passBlock('low-pass', 'butterworth', order, 60))
    )
  ),
  ...rowsOf<number>(
    {
      number: 51,
      what: 'Butterworth low-pass order 4, octaves beyond the corner, dB',
      tolerance: absolute(0.001),
      source: BUTTERWORTH
    },
    [
      [1, -24.099],
      [2, -48.165],
      [4, -96.33]
    ],
    (octaves) => db(25 * 2 ** octaves, passBlock('low-pass', 'butterworth', 4, 25))
  ),
  ...besselCorners,
  ...besselPoles
];
