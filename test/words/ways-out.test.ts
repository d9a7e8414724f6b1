import { describe, expect, test } from 'vitest';
import type { FindingCode, WayOut } from '$lib/engine/budget/budget';
import { wayOutText } from '$lib/words/ways-out';
import { sheet } from './specimen';

type Kind = WayOut['kind'];
type Row = Pick<WayOut, 'changes' | 'facts'> & { readonly says: string };

const way = (kind: Kind, parts: Partial<WayOut>): WayOut => ({
  kind,
  changes: [],
  facts: { value: 1, before: null },
  marginAfter: 0.04,
  remaining: [],
  ...parts
});
const say = (w: WayOut, code: FindingCode = 'limit-cone-travel'): string => wayOutText(w, code, sheet);

/** One row at least for every kind there is: a kind without one does not compile. */
const ROWS: { readonly [K in Kind]: readonly Row[] } = {
  level: [
    {
      changes: [{ set: 'level', value: 103.2 }],
      facts: { value: 103.2, before: 105, givesUp: 1.8 },
      says: 'Listen 1.8 dB lower, at 103.2 dB.'
    }
  ],
  'high-pass': [
    {
      changes: [{ set: 'add-high-pass', order: 4, value: 22.4 }],
      facts: { value: 22.4, before: null, order: 4, givesUp: 2.13 },
      says: 'Add a fourth-order high-pass at 22.4 Hz, which gives up 2.1 dB at the bottom of the band.'
    },
    {
      changes: [{ set: 'block-corner', block: 1, value: 22.4 }],
      facts: { value: 22.4, before: 15, order: 2, givesUp: 0 },
      says: 'Move the high-pass from 15 Hz to 22.4 Hz.'
    }
  ],
  transform: [
    {
      changes: [{ set: 'block-to', block: 2, value: 28.5 }],
      facts: { value: 28.5, before: 24, givesUp: 1.4 },
      says: 'Set the Linkwitz transform to 28.5 Hz instead of 24 Hz, which gives up 1.4 dB at the bottom of the band.'
    }
  ],
  shelf: [
    {
      changes: [{ set: 'block-gain', block: 0, value: 4.1 }],
      facts: { value: 4.1, before: 6, givesUp: 1.2 },
      says: 'Set the low shelf to 4.1 dB instead of 6.0 dB, which gives up 1.2 dB at the bottom of the band.'
    }
  ],
  drivers: [
    {
      changes: [{ set: 'drivers', count: 2, wiring: 'series' }],
      facts: { value: 2, before: 1, count: 2, wiring: 'series', nominal: 8, qtc: 0.884 },
      says: 'Fit 2 drivers instead of 1, wired in series (8 ohm), in the same box; Qtc is then 0.88.'
    }
  ],
  'drivers-and-box': [
    {
      changes: [
        { set: 'drivers', count: 4, wiring: 'parallel' },
        { set: 'inner-volume', value: 0.1266 }
      ],
      facts: { value: 0.116, before: 2, count: 4, wiring: 'parallel', nominal: 4, qtc: 0.76 },
      says: 'Fit 4 drivers instead of 2, wired in parallel (4 ohm), and make the box 116 L net (126.6 L inside); Qtc is then 0.76.'
    }
  ],
  amplifier: [
    {
      changes: [{ set: 'ratings', powers: [810, 450] }],
      facts: {
        value: 810,
        before: 500,
        ratings: [
          { power: 810, load: 4 },
          { power: 450, load: 8 }
        ]
      },
      says: 'Fit an amplifier of 810 W into 4 ohm and 450 W into 8 ohm.'
    }
  ],
  volume: [
    {
      changes: [{ set: 'net-volume', value: 0.085 }],
      facts: { value: 0.085, before: 0.057, qtc: 0.62 },
      says: 'Make the box 85 L net instead of 57 L; Qtc is then 0.62.'
    },
    {
      changes: [{ set: 'inner-volume', value: 0.09 }],
      facts: { value: 0.085, before: 0.057, qtc: 0.62 },
      says: 'Make the box 85 L net instead of 57 L (90 L inside); Qtc is then 0.62.'
    }
  ],
  wiring: [
    // The specimen has one driver of two coils: only the coils are a choice.
    {
      changes: [{ set: 'wiring', coilWiring: 'series', driverWiring: 'parallel' }],
      facts: { value: 8, before: 2, nominal: 8, coilWiring: 'series', wiring: 'parallel' },
      says: 'Wire coils in series, which makes 8 ohm.'
    }
  ],
  cable: [
    {
      changes: [{ set: 'cable', value: 0.11 }],
      facts: { value: 0.11, before: 0.9 },
      says: 'Bring the cable down from 0.9 ohm to 0.11 ohm, thicker or shorter.'
    }
  ],
  band: [
    {
      changes: [{ set: 'goal-to', value: 65 }],
      facts: { value: 65, before: 80 },
      says: 'Want the level only up to 65 Hz.'
    },
    {
      changes: [
        { set: 'goal-from', value: 22 },
        { set: 'goal-to', value: 65 }
      ],
      facts: { value: 22, before: 20 },
      says: 'Want the level only from 22 Hz up and up to 65 Hz.'
    }
  ]
};

const CASES = Object.entries(ROWS).flatMap(([kind, rows]) =>
  rows.map((row) => ({ ...row, kind: kind as Kind }))
);

test.for(CASES)('$kind: $says', ({ kind, changes, facts, says }) => {
  const text = say(way(kind, { changes, facts }));
  expect(text).toBe(`${says} Then it holds, with under 0.1 dB in hand.`);
});

describe('what then still stands', () => {
  const level = { facts: { value: 103.2, before: 105 } };

  test('is said with by how much, and marks a cure that is not enough', () => {
    const remaining = [
      { code: 'limit-amplifier-voltage', by: 1.24 },
      { code: 'limit-amplifier-current', by: 0.02 },
      { code: 'load-low', by: null }
    ] as const;
    expect(say(way('level', { ...level, marginAfter: -1.24, remaining }))).toBe(
      'Listen 1.8 dB lower, at 103.2 dB. Not enough by itself: amplifier volts (1.2 dB over), ' +
        "amplifier amps (under 0.1 dB over) and a load below the amplifier's minimum."
    );
  });

  test('is something else where the finding is not about limits', () => {
    const remaining = [{ code: 'limit-cone-travel', by: 3.6 }] as const;
    expect(say(way('band', { changes: [{ set: 'goal-to', value: 65 }], remaining }), 'goal-short')).toMatch(
      /Still in the way then: cone travel \(3\.6 dB over\)\.$/
    );
  });
});
