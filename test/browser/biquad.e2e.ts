/**
 * The shaping blocks against the browser's own filters: BiquadFilterNode.getFrequencyResponse of the W3C Web Audio API. It rests on the same cookbook
 * but was written apart from this project. Digital filters at a high sample rate stand in for analogue ones: from 5 to 200 Hz the difference
 * of the two kinds stays under a thousandth of a decibel.
 * Source: W3C, "Web Audio API", filter characteristics: Q in dB for low-pass and high-pass, slope 1 (Q 1/√2) for shelves, plain Q for the rest.
 */
import { expect, test, type Page } from '@playwright/test';
import type { Block, Family } from '../../src/lib/engine/shaping/block';
import { cascadePhase, cascadePower, compileCascade } from '../../src/lib/engine/shaping/cascade';
import { absolute, angle, Comparison } from '../tolerance';

interface Filter {
  readonly type: 'lowpass' | 'highpass' | 'lowshelf' | 'peaking' | 'allpass';
  readonly frequency: number;
  readonly Q?: number;
  readonly gain?: number;
}

interface Case {
  readonly name: string;
  readonly blocks: readonly Block[];
  /** In a row. */
  readonly filters: readonly Filter[];
}

const SAMPLE_RATE = 192_000;
/** As the browser takes them, in single precision. */
const FREQUENCIES = Array.from({ length: 200 }, (_, i) => Math.fround(5 * 40 ** (i / 199)));
const DB = absolute(0.01);
const DEGREES = angle(0.1);

const PLAIN = { bypass: false, fixed: false } as const;
const SIDES = ['low-pass', 'high-pass'] as const;
const typeOf = (kind: (typeof SIDES)[number]) => (kind === 'low-pass' ? 'lowpass' : 'highpass');
const pole = (kind: (typeof SIDES)[number], frequency: number, q: number): Filter => {
  return { type: typeOf(kind), frequency, Q: 20 * Math.log10(q) };
};

/**
 * Pole pairs as frequency re the corner and Q. Sources: numbers 48, 49, 53 and 54 of the published checks (S. Butterworth, 1930; W. E. Thomson, 1949);
 * Linkwitz–Riley as two Butterworth filters in a row (S. Linkwitz, JAES 24(1), 1976).
 */
const PAIRS: readonly (readonly [family: Family, order: number, poles: [ratio: number, q: number][]])[] = [
  ['butterworth', 2, [[1, 0.70711]]],
  [
    'butterworth',
    4,
    [
      [1, 0.5412],
      [1, 1.30656]
    ]
  ],
  [
    'butterworth',
    6,
    [
      [1, 0.51764],
      [1, 0.70711],
      [1, 1.93185]
    ]
  ],
  [
    'butterworth',
    8,
    [
      [1, 0.5098],
      [1, 0.60134],
      [1, 0.89998],
      [1, 2.56292]
    ]
  ],
  ['linkwitz-riley', 2, [[1, 0.5]]],
  [
    'linkwitz-riley',
    4,
    [
      [1, 0.70711],
      [1, 0.70711]
    ]
  ],
  [
    'linkwitz-riley',
    8,
    [
      [1, 0.5412],
      [1, 1.30656],
      [1, 0.5412],
      [1, 1.30656]
    ]
  ],
  ['bessel', 2, [[1.27202, 0.57735]]],
  [
    'bessel',
    4,
    [
      [1.43017, 0.52193],
      [1.60336, 0.80554]
    ]
  ],
  [
    'bessel',
    6,
    [
      [1.60392, 0.51032],
      [1.68917, 0.61119],
      [1.90471, 1.02331]
    ]
  ],
  [
    'bessel',
    8,
    [
      [1.77847, 0.50599],
      [1.83209, 0.55961],
      [1.9532, 0.71085],
      [2.18873, 1.22567]
    ]
  ]
];
const families = SIDES.flatMap((kind) =>
  PAIRS.map(([family, order, poles]): Case => {
    return {
      name: `${family} ${kind} of order ${order}`,
      blocks: [{ kind, family, order, corner: 60, ...PLAIN }],
      filters: poles.map(([ratio, q]) => pole(kind, kind === 'low-pass' ? 60 * ratio : 60 / ratio, q))
    };
  })
);

/** A pair of any Q, which a plan writes as a bare section. */
const sections = SIDES.flatMap((kind) =>
  [0.4, 1, 6].map((q): Case => {
    const f0 = 40;
    return {
      name: `a section: ${kind} 40 Hz of Q ${q}`,
      blocks: [
        {
          kind: 'section',
          b: kind === 'low-pass' ? [0, 0, f0 * f0] : [1, 0, 0],
          a: [1, f0 / q, f0 * f0],
          ...PLAIN
        }
      ],
      filters: [pole(kind, f0, q)]
    };
  })
);

const equalisers = [-12, -3, 4, 15].flatMap((gain): Case[] => [
  {
    name: `second-order shelf of ${gain} dB`,
    blocks: [{ kind: 'low-shelf', order: 2, corner: 35, gain, q: Math.SQRT1_2, ...PLAIN }],
    filters: [{ type: 'lowshelf', frequency: 35, gain }]
  },
  ...[0.7, 4, 12].map((q): Case => {
    return {
      name: `peak of ${gain} dB, Q ${q}`,
      blocks: [{ kind: 'peak', centre: 32, q, gain, ...PLAIN }],
      filters: [{ type: 'peaking', frequency: 32, Q: q, gain }]
    };
  })
]);

const others: Case[] = [
  ...[0.5, 0.7, 3].map((q): Case => {
    return {
      name: `all-pass of Q ${q}`,
      blocks: [{ kind: 'all-pass', order: 2, corner: 60, q, ...PLAIN }],
      filters: [{ type: 'allpass', frequency: 60, Q: q }]
    };
  }),
  {
    // S. Linkwitz, "Loudspeaker System Design", Wireless World, 1978: what the transform is for.
    name: 'Linkwitz transform after a high-pass of 40 Hz, Q 0.9 is one of 20 Hz, Q 0.7',
    blocks: [
      { kind: 'section', b: [1, 0, 0], a: [1, 40 / 0.9, 1600], ...PLAIN },
      { kind: 'linkwitz-transform', from: 40, fromQ: 0.9, to: 20, toQ: 0.7, ...PLAIN }
    ],
    filters: [pole('high-pass', 20, 0.7)]
  }
];

/** What the browser's filters do, each at every frequency: ratio and radians. */
function browserResponses(
  page: Page,
  filters: readonly Filter[]
): Promise<{ size: number[]; turn: number[] }[]> {
  return page.evaluate(
    ({ filters, frequencies, rate }) => {
      const context = new OfflineAudioContext(1, 1, rate);
      return filters.map(({ type, frequency, Q, gain }) => {
        const node = context.createBiquadFilter();
        node.type = type;
        node.frequency.value = frequency;
        if (Q !== undefined) node.Q.value = Q;
        if (gain !== undefined) node.gain.value = gain;
        const size = new Float32Array(frequencies.length);
        const turn = new Float32Array(frequencies.length);
        node.getFrequencyResponse(new Float32Array(frequencies), size, turn);
        return { size: [...size], turn: [...turn] };
      });
    },
    { filters, frequencies: FREQUENCIES, rate: SAMPLE_RATE }
  );
}

async function compare(page: Page, { name, blocks, filters }: Case, all: Comparison): Promise<void> {
  const responses = await browserResponses(page, filters);
  const cascade = compileCascade(blocks, { fc: NaN, qtc: NaN });
  FREQUENCIES.forEach((f, i) => {
    const db = responses.reduce((sum, r) => sum + 20 * Math.log10(r.size[i]), 0);
    const turn = responses.reduce((sum, r) => sum + (r.turn[i] * 180) / Math.PI, 0);
    const at = `${name} at ${f.toFixed(2)} Hz`;
    all.check(`${at}, dB`, 10 * Math.log10(cascadePower(cascade, f)), db, DB);
    all.check(`${at}, degrees`, (cascadePhase(cascade, f) * 180) / Math.PI, turn, DEGREES);
  });
}

const GROUPS = { families, sections, equalisers, 'all-passes and the transform': others };

for (const [group, cases] of Object.entries(GROUPS))
  test(`the browser's own filters agree with the shaping: ${group}`, async ({ page }) => {
    const all = new Comparison();
    for (const one of cases) await compare(page, one, all);
    expect(all.misses, all.nearest).toEqual([]);
    expect(all.count).toBe(2 * FREQUENCIES.length * cases.length);
  });

test("the browser's own filters notice a corner one per cent off", async ({ page }) => {
  const all = new Comparison();
  await compare(
    page,
    { ...families[1], filters: families[1].filters.map((f) => ({ ...f, frequency: 60.6 })) },
    all
  );
  expect(all.misses.length).toBeGreaterThan(100);
});
