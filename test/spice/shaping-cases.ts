/** Shaping blocks and the circuits that should do the same. Sources stand at each group and in `stages.ts`. */
import type { Block, Family } from '$lib/engine/shaping/block';
import {
  allPassCircuit,
  butterworthLadder,
  doubler,
  inputCapacitor,
  integratorLoop,
  inverter,
  linkwitzCircuit,
  lineStage,
  peakCircuit,
  polePair,
  shelfCircuit,
  type Stage
} from './stages';

export interface Case {
  readonly name: string;
  readonly blocks: readonly Block[];
  readonly stages: readonly Stage[];
  /** Some value in it is typed from a table or a catalogue, with four or five places. */
  readonly rounded?: boolean;
}

const PLAIN = { bypass: false, fixed: false } as const;
export const KINDS = ['low-pass', 'high-pass'] as const;
const ORDERS = [1, 2, 3, 4, 5, 6, 7, 8];

type Kind = (typeof KINDS)[number];
export const pass = (kind: Kind, family: Family, order: number, corner: number): Block => {
  return { kind, family, order, corner, ...PLAIN };
};

/** Source: S. Butterworth, 1930; element tables as in A. I. Zverev, "Handbook of Filter Synthesis", 1967 (from memory). */
export const butterworth = KINDS.flatMap((kind) =>
  ORDERS.map((order): Case => {
    return {
      name: `Butterworth ${kind} of order ${order}, a ladder`,
      blocks: [pass(kind, 'butterworth', order, 45)],
      stages: [butterworthLadder(kind, order, 45)],
      rounded: true
    };
  })
);

/** Source: S. Linkwitz, "Active Crossover Networks for Noncoincident Drivers", JAES 24(1), 1976: two equal Butterworth filters in a row. */
const linkwitzRiley = KINDS.flatMap((kind) =>
  [2, 4, 6, 8].map((order): Case => {
    const half = butterworthLadder(kind, order / 2, 70);
    return {
      name: `Linkwitz–Riley ${kind} of order ${order}, two ladders`,
      blocks: [pass(kind, 'linkwitz-riley', order, 70)],
      stages: [half, half],
      rounded: true
    };
  })
);

/**
 * Reverse Bessel polynomials, ascending powers, and where the low-pass they make is 3.01 dB down (rad/s). Source: W. E. Thomson, "Delay networks
 * having maximally flat frequency characteristics", Proc. IEE, 1949 (coefficients from memory; the corners are number 52 of the published checks).
 */
const BESSEL: { readonly [order: number]: { readonly theta: number[]; readonly corner: number } } = {
  1: { theta: [1, 1], corner: 1 },
  2: { theta: [3, 3, 1], corner: 1.361654 },
  3: { theta: [15, 15, 6, 1], corner: 1.755672 },
  4: { theta: [105, 105, 45, 10, 1], corner: 2.113918 },
  5: { theta: [945, 945, 420, 105, 15, 1], corner: 2.427411 },
  6: { theta: [10395, 10395, 4725, 1260, 210, 21, 1], corner: 2.703395 },
  7: { theta: [135135, 135135, 62370, 17325, 3150, 378, 28, 1], corner: 2.951722 },
  8: { theta: [2027025, 2027025, 945945, 270270, 51975, 6930, 630, 36, 1], corner: 3.179617 }
};
const besselLoops = KINDS.flatMap((kind) =>
  ORDERS.map((order): Case => {
    const { theta, corner } = BESSEL[order];
    // In S = s/corner; a high-pass has S turned into 1/S, which reverses the row.
    const scaled = theta.map((t, k) => t * corner ** k);
    const loop =
      kind === 'low-pass'
        ? integratorLoop([theta[0]], scaled, 50)
        : integratorLoop([...Array<number>(order).fill(0), theta[0]], [...scaled].reverse(), 50);
    return {
      name: `Bessel ${kind} of order ${order}, an integrator loop`,
      blocks: [pass(kind, 'bessel', order, 50)],
      stages: [loop]
    };
  })
);

/** Source: numbers 53 and 54 of the published checks (W. E. Thomson, 1949): poles as frequency re the corner and Q; Q null is a real pole. */
const BESSEL_POLES: { readonly [order: number]: readonly (readonly [f: number, q: number | null])[] } = {
  2: [[1.27202, 0.57735]],
  3: [
    [1.32268, null],
    [1.44762, 0.69105]
  ],
  4: [
    [1.43017, 0.52193],
    [1.60336, 0.80554]
  ],
  6: [
    [1.60392, 0.51032],
    [1.68917, 0.61119],
    [1.90471, 1.02331]
  ],
  8: [
    [1.77847, 0.50599],
    [1.83209, 0.55961],
    [1.9532, 0.71085],
    [2.18873, 1.22567]
  ]
};
const besselResonators = KINDS.flatMap((kind) =>
  Object.entries(BESSEL_POLES).map(([order, poles]): Case => {
    return {
      name: `Bessel ${kind} of order ${order}, resonators`,
      blocks: [pass(kind, 'bessel', Number(order), 50)],
      stages: poles.map(([f, q]) => polePair(kind, kind === 'low-pass' ? 50 * f : 50 / f, q)),
      rounded: true
    };
  })
);

/** Source: S. Linkwitz, "Loudspeaker System Design", Wireless World, 1978: the circuit itself. */
const transforms = [
  [40, 0.9, 20, 0.7],
  [55, 1.2, 24, 0.6],
  [33, 0.71, 18, 0.5]
].map(([f0, q0, fp, qp]): Case => {
  return {
    name: `Linkwitz transform ${f0} Hz/${q0} to ${fp} Hz/${qp}, its circuit`,
    blocks: [{ kind: 'linkwitz-transform', from: f0, fromQ: q0, to: fp, toQ: qp, ...PLAIN }],
    stages: [linkwitzCircuit(f0, q0, fp, qp)]
  };
});

const boundTransform: Case = {
  name: 'Linkwitz transform bound to a box of 40 Hz/0.9, its circuit',
  blocks: [{ kind: 'linkwitz-transform', from: 'box', fromQ: 'box', to: 20, toQ: 0.7, ...PLAIN }],
  stages: [linkwitzCircuit(40, 0.9, 20, 0.7)]
};

export const lowShelf = (order: 1 | 2, corner: number, gain: number, q: number): Block => {
  return { kind: 'low-shelf', order, corner, gain, q, ...PLAIN };
};

/** "Audio EQ Cookbook", W3C Working Group Note, 2021 (from memory): A·(S² + S√A/Q + A)/(A·S² + S√A/Q + 1), as it stands there. */
export function cookbookShelf(corner: number, gain: number, q: number): Stage {
  const a = 10 ** (gain / 40);
  return integratorLoop([a * a, (a * Math.sqrt(a)) / q, a], [1, Math.sqrt(a) / q, a], corner);
}

const equalisers = [6, -8, 15].flatMap((gain): Case[] => [
  {
    name: `first-order shelf of ${gain} dB, a divider`,
    blocks: [lowShelf(1, 40, gain, Math.SQRT1_2)],
    stages: [shelfCircuit(40, gain)]
  },
  ...[Math.SQRT1_2, 1.1].map((q): Case => {
    return {
      name: `second-order shelf of ${gain} dB, Q ${q.toFixed(2)}, an integrator loop`,
      blocks: [lowShelf(2, 35, gain, q)],
      stages: [cookbookShelf(35, gain, q)]
    };
  }),
  ...[0.8, 5].map((q): Case => {
    return {
      name: `peak of ${gain} dB, Q ${q}, a resonator`,
      blocks: [{ kind: 'peak', centre: 32, q, gain, ...PLAIN }],
      stages: [peakCircuit(32, q, gain)]
    };
  })
]);

/** Circuit theory. */
const others: Case[] = [
  ...([1, 2] as const).map((order): Case => {
    return {
      name: `all-pass of order ${order}, a bridge`,
      blocks: [{ kind: 'all-pass', order, corner: 60, q: 0.7, ...PLAIN }],
      stages: [allPassCircuit(order, 60, 0.7)]
    };
  }),
  {
    name: 'delay of 1.5 ms, a line',
    blocks: [{ kind: 'delay', delay: 1.5e-3, ...PLAIN }],
    stages: [lineStage(1.5e-3)]
  },
  {
    name: 'gain of 6.0206 dB, two equal resistors',
    blocks: [{ kind: 'gain', gain: 6.0206, ...PLAIN }],
    stages: [doubler]
  },
  { name: 'polarity, an inverter', blocks: [{ kind: 'polarity', ...PLAIN }], stages: [inverter] },
  {
    name: 'a section of any coefficients, an integrator loop of 1 Hz',
    blocks: [{ kind: 'section', b: [0.5, 12, -300], a: [2, 30, 900], ...PLAIN }],
    stages: [integratorLoop([-300, 12, 0.5], [900, 30, 2], 1)]
  },
  {
    // Number 64 of the published checks: 3 dB down at 7 Hz (common practice).
    name: 'first-order high-pass of 7 Hz, 1.0335 µF into 22 kΩ',
    blocks: [pass('high-pass', 'butterworth', 1, 7)],
    stages: [inputCapacitor(1.0335e-6, 22e3)],
    rounded: true
  },
  {
    // Number 63 of the published checks: the gentle lift (common practice).
    name: 'two low-passes and a gain of two, ladders and an amplifier',
    blocks: [
      pass('low-pass', 'butterworth', 2, 75),
      pass('low-pass', 'butterworth', 1, 40),
      { kind: 'gain', gain: 6.0206, ...PLAIN }
    ],
    stages: [butterworthLadder('low-pass', 2, 75), butterworthLadder('low-pass', 1, 40), doubler],
    rounded: true
  },
  {
    name: 'many blocks in a row; bypassed ones are not there',
    blocks: [
      pass('low-pass', 'linkwitz-riley', 4, 80),
      { ...pass('high-pass', 'butterworth', 8, 100), bypass: true },
      { kind: 'linkwitz-transform', from: 40, fromQ: 0.9, to: 20, toQ: 0.7, ...PLAIN },
      { kind: 'peak', centre: 32, q: 5, gain: -8, ...PLAIN },
      { kind: 'polarity', ...PLAIN },
      { kind: 'all-pass', order: 2, corner: 60, q: 0.7, ...PLAIN },
      { kind: 'delay', delay: 4e-3, ...PLAIN },
      lowShelf(1, 40, 6, Math.SQRT1_2)
    ],
    stages: [
      butterworthLadder('low-pass', 2, 80),
      butterworthLadder('low-pass', 2, 80),
      linkwitzCircuit(40, 0.9, 20, 0.7),
      peakCircuit(32, 5, -8),
      inverter,
      allPassCircuit(2, 60, 0.7),
      lineStage(4e-3),
      shelfCircuit(40, 6)
    ],
    rounded: true
  }
];

export const CASES: readonly Case[] = [
  ...butterworth,
  ...linkwitzRiley,
  ...besselLoops,
  ...besselResonators,
  ...transforms,
  boundTransform,
  ...equalisers,
  ...others
];
