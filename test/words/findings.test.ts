import { describe, expect, test } from 'vitest';
import type { Finding, FindingCode } from '$lib/engine/budget/budget';
import { findingText, findingWords } from '$lib/words/findings/finding-words';
import { finding } from './specimen';

interface Row {
  readonly facts: Finding['facts'];
  /** What the text must hold: the facts' own numbers as a person reads them. */
  readonly says: readonly string[];
  readonly at?: number | null;
  readonly severity?: Finding['severity'];
}

const loads = [
  { coilWiring: 'parallel', driverWiring: 'parallel', nominal: 2, belowMinimum: true },
  { coilWiring: 'single', driverWiring: 'parallel', nominal: 4, belowMinimum: false },
  { coilWiring: 'series', driverWiring: 'parallel', nominal: 8, belowMinimum: false }
] as const;

/** One row at least for every code there is: a code without one does not compile. */
const ROWS: { readonly [C in FindingCode]: readonly Row[] } = {
  'limit-amplifier-voltage': [
    {
      facts: { margin: -1.67, allowed: 44.7, demanded: 54.2, level: 105, maxLevel: 103.33 },
      says: ['At 21 Hz', '54.2 V of its 44.7 V', '1.7 dB over', '103.3 dB', '105 dB is wanted']
    }
  ],
  'limit-amplifier-current': [
    {
      facts: { margin: -1.67, allowed: 11.2, demanded: 13.6, level: 105, maxLevel: 103.33 },
      says: ['13.6 A of its 11.2 A', '1.7 dB over']
    }
  ],
  'limit-cone-travel': [
    {
      facts: { margin: -1.67, allowed: 0.016, demanded: 0.0194, level: 105, maxLevel: 103.33 },
      says: ['19.4 mm of its 16 mm', '1.7 dB over', 'Xmax']
    },
    {
      facts: { margin: -0.03, allowed: 0.016, demanded: 0.016055, level: 105, maxLevel: 104.97 },
      says: ['16.1 mm of its 16 mm', 'under 0.1 dB over', '104.9 dB']
    }
  ],
  'limit-mechanical-stop': [
    {
      facts: { margin: -1.67, allowed: 0.027, demanded: 0.0327, level: 105, maxLevel: 103.33 },
      says: ['32.7 mm', '27 mm to its stop', '1.7 dB over']
    }
  ],
  'limit-coil-heat': [
    {
      facts: { margin: -1.67, allowed: 7.1, demanded: 8.6, level: 105, maxLevel: 103.33 },
      says: ['8.6 A', '7.1 A its heat allows', '1.7 dB over']
    }
  ],
  'not-judged': [
    {
      facts: { missing: ['xmech', 'power'] },
      says: ["cone's stop (xmech_mm is missing)", 'coil heat (power_W is missing)', 'them']
    },
    { facts: { missing: ['xmax'] }, says: ['cone travel (xmax_mm is missing)', ' it:'] }
  ],
  'margin-thin': [
    {
      facts: { limit: 'amplifier-voltage', margin: 0.02 },
      says: ['Amplifier volts have under 0.1 dB in hand at 21 Hz']
    }
  ],
  'room-doubt': [
    { facts: { holds: true, doubt: 4, turnsAt: 1.23 }, says: ['Limits hold unless', '1.2 dB less', '4 dB'] },
    { facts: { holds: false, doubt: 4, turnsAt: 0.02 }, says: ['Limits would hold', 'under 0.1 dB more'] }
  ],
  infrasonic: [
    {
      facts: { limit: 'cone-travel', margin: -5.3, from: 5 },
      at: 7.2,
      says: ['down to 5 Hz', 'cone travel', '5.3 dB over', 'at 7.2 Hz']
    }
  ],
  'no-high-pass': [
    { facts: { boost: 8.2, boostAt: 18.4 }, at: null, says: ['8.2 dB', '18 Hz', 'no high-pass'] }
  ],
  'boost-high': [
    // engine.md §3: 15 dB is 31.6 times, 15 W become 474 W.
    {
      facts: { boost: 15, power: 31.6228, strong: true },
      says: ['15.0 dB', '31.6 times the power', '15 W become 474 W']
    },
    { facts: { boost: 7, power: 5.01187, strong: false }, says: ['7.0 dB', '5.01 times', '75.2 W'] }
  ],
  'boost-short': [
    {
      facts: { limit: 'cone-travel', boostHere: 9.2, short: 4.4 },
      says: ['9.2 dB of boost at 21 Hz', '4.4 dB more than cone travel allows']
    },
    {
      facts: { limit: 'amplifier-current', boostHere: 3.5, short: 3.5 },
      says: ['3.5 dB of boost', 'amplifier amps allow none']
    }
  ],
  'transform-large': [{ facts: { lift: 18.2, block: 2 }, says: ['/shaping/2', '18.2 dB'] }],
  'air-spring': [
    { facts: { share: 0.072, secondHarmonic: 0.0432 }, says: ['7.2 %', '4.3 % second harmonic'] }
  ],
  sag: [
    {
      facts: { sag: 0.00056, withCreep: 0.00084, share: 0.0528, facing: 'down' },
      says: ['Facing down', '0.56 mm', '0.84 mm', '5.3 % of Xmax']
    }
  ],
  'cable-loss': [
    { facts: { loss: 2.09, qesRise: 0.272, resistance: 0.9 }, says: ['0.9 ohm', '2.1 dB', '27 %', '0.0175'] }
  ],
  'source-resistance': [
    { facts: { qtcWith: 1.16, qtcWithout: 0.74, resistance: 2.3 }, says: ['2.3 ohm', 'from 0.74 to 1.16'] }
  ],
  'hot-coil': [
    {
      facts: { limit: 'coil-heat', margin: -0.4, levelLoss: 2.5, rise: 150 },
      says: ['150 K', '2.5 dB', 'coil heat 0.4 dB over', '21 Hz']
    }
  ],
  'losses-missing': [
    {
      facts: { qtc: 0.731, fill: false, absorption: true, leakage: true },
      says: ['q_absorption', 'q_leakage', '0.73', 'upper bound', '5 to 10']
    },
    {
      facts: { qtc: 0.731, fill: true, absorption: false, leakage: true },
      says: ['left out: leakage (q_leakage).', '2 to 5', '1.10 to 1.20']
    }
  ],
  'goal-short': [
    {
      facts: { short: 6.02, level: 105, tolerance: 3, shapingHere: -6 },
      at: 80,
      says: ['6.0 dB', '105 dB', 'at 80 Hz', '3 dB is tolerated', 'Shaping alone takes 6.0 dB']
    },
    {
      facts: { short: 4, level: 105, tolerance: 2.5, shapingHere: 3 },
      at: 20,
      says: ['4.0 dB', '2.5 dB is tolerated', 'Driver, box and room']
    }
  ],
  'load-low': [
    {
      facts: { nominal: 2, minimum: 4, loads },
      at: null,
      says: ['2 ohm', 'minimum load of 4 ohm', 'one coil alone makes 4 ohm or coils in series makes 8 ohm']
    },
    { facts: { nominal: 2, minimum: 4, loads: loads.slice(0, 1) }, at: null, says: ['No wiring'] }
  ],
  'qtc-high': [
    {
      facts: { qtc: 1.25, hotQtc: 1.61, peak: 2.7, peakAt: 62.4 },
      says: ['1.25', '1.61', '2.7 dB at 62 Hz']
    },
    {
      facts: { qtc: 0.75, hotQtc: 1.24, peak: 0.04, peakAt: 90 },
      severity: 'note',
      says: ['0.75', '1.24', 'Well aligned cold']
    }
  ],
  'qtc-low': [{ facts: { qtc: 0.45, hotQtc: 0.6, peak: 0, peakAt: null }, says: ['0.45', '0.60', 'early'] }],
  'driver-contradiction': [
    {
      facts: { key: 'qts', given: 0.6, derived: 0.4478, ratio: 1.34, slip: null },
      says: ['qts is given as 0.6', '0.448', '34 % more']
    },
    {
      facts: { key: 'mms', given: 0.05, derived: 0.17, ratio: 0.294, slip: null },
      says: ['mms_g is given as 50 g', '170 g', '3.4 times less']
    },
    {
      facts: { key: 'bl', given: 24.6, derived: 12.3, ratio: 2, slip: 'coils' },
      says: ['bl_Tm is given as 24.6 Tm', '12.3 Tm', 'all coils']
    },
    {
      facts: { key: 'cms', given: 0.4e-3, derived: 0.1e-3, ratio: 4, slip: 'factor-four' },
      says: ['cms_mm_per_N is given as 0.4 mm/N', '0.1 mm/N', 'factor of four']
    },
    {
      facts: { key: 'rms', given: 9, derived: 4.5, ratio: 2, slip: 'factor-two' },
      says: ['rms_kg_per_s is given as 9 kg/s', '4.5 kg/s', 'factor of two']
    },
    {
      facts: { key: 'mms', given: 170, derived: 0.17, ratio: 1000, slip: 'unit-thousand' },
      says: ['thousand']
    }
  ],
  'driver-suspicious': [
    {
      facts: { what: 'xmax-large', value: 0.05, low: 0, high: 0.0375, slip: 'peak-to-peak' },
      says: ['xmax_mm is 50 mm', 'up to 37.5 mm', 'peak-to-peak']
    },
    {
      facts: { what: 'xmech-close', value: 1.02, low: 1.05, high: 6, slip: null },
      says: ['1.02', '1.05 to 6']
    },
    {
      facts: { what: 'area-size', value: 0.002, low: 0.03, high: 60, slip: 'diameter-for-area' },
      says: ['0.02 cm²/L', '0.3 cm²/L to 600 cm²/L', 'diameter']
    },
    {
      facts: { what: 'mass-area', value: 22, low: 0.2, high: 15, slip: null },
      says: ['22 kg/m²', '15 kg/m²']
    },
    {
      facts: { what: 'nominal-re', value: 1.6, low: 0.6, high: 1.05, slip: 'coils' },
      says: ['1.6', '0.6 to 1.05', 'all coils']
    },
    {
      facts: { what: 'qts-range', value: 1.8, low: 0.12, high: 1.5, slip: null },
      says: ['Qts is 1.8', '0.12 to 1.5']
    },
    {
      facts: { what: 'inductance-large', value: 0.004, low: 0, high: 0.0025, slip: null },
      says: ['4 mH per ohm', 'up to 2.5 mH per ohm']
    },
    {
      facts: { what: 'efficiency-range', value: 0.12, low: 2e-5, high: 0.08, slip: null },
      says: ['12 %', '0.002 % to 8 %']
    }
  ],
  'net-small': [
    { facts: { net: 0.003, displacement: 0.0046, estimated: true }, says: ['3 L', '4.6 L', 'estimate'] },
    { facts: { net: 0.003, displacement: 0.0046, estimated: false }, says: ['3 L', '4.6 L'] }
  ],
  'boundary-dip': [{ facts: { depth: 4.3 }, at: 71.3, says: ['4.3 dB', '71.3 Hz'] }],
  'displacement-estimated': [
    { facts: { each: 0.0046, total: 0.0092 }, says: ['4.6 L', '9.2 L in all', '40 %'] },
    { facts: { each: 0.0046, total: 0.0046 }, says: ['4.6 L'] }
  ],
  'alignment-differs': [
    { facts: { alignmentF3: 34.4, circuitF3: 38.1 }, says: ['34.4 Hz', '38.1 Hz'] },
    { facts: { alignmentF3: 34.4, circuitF3: null }, says: ['34.4 Hz', 'none'] }
  ],
  'single-rating': [
    { facts: { lowestImpedance: 3.35, load: 4 }, at: 68, says: ['4 ohm', '3.35 ohm at 68 Hz'] }
  ],
  exposure: [
    { facts: { peakC: 138.14, action: 135 }, at: 50, says: ['138.1 dB(C)', '135 dB(C)', '50 Hz', 'hearing'] }
  ]
};

const CASES = Object.entries(ROWS).flatMap(([code, rows]) =>
  rows.map((row, i) => ({ ...row, code: code as FindingCode, name: `${code} ${i + 1}` }))
);

describe('every finding has its words', () => {
  test.for(CASES)('$name', ({ code, facts, says, at = 21, severity = 'caution' }) => {
    const text = findingText(finding(code, facts, { at, severity }));
    for (const part of says) expect(text).toContain(part);
  });

  test.for(CASES)('$name stays readable without a place, whatever its gravity', ({ code, facts }) => {
    for (const severity of ['blocking', 'caution', 'note'] as const) {
      const { fact, meaning } = findingWords(finding(code, facts, { at: null, severity }));
      const text = `${fact} ${meaning}`;
      expect(text).not.toMatch(/NaN|undefined|null|Infinity|\[object| {2}/);
      expect(fact).toMatch(/^[A-Za-z].*[^.]\.$/s);
      expect(meaning).toMatch(/^[A-Z].*[^.][.?]$/s);
      expect(text).not.toMatch(/-\d/);
      expect(text.length).toBeLessThan(360);
    }
  });
});
