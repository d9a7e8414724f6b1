import { describe, expect, test } from 'vitest';
import { report } from '$lib/words/report';
import { budget, chain, finding, plan } from './specimen';

/** plan-format page, "check --json gives at least": every key, in its order. */
const KEYS = {
  '': [
    'title',
    'holds',
    'sentence',
    'driver',
    'alignment',
    'system',
    'limits',
    'max_level_dB',
    'max_level_limit',
    'max_level_Hz',
    'master_drive_V',
    'demand',
    'findings',
    'exposure',
    'limiter',
    'room_doubt',
    'hot',
    'ledger'
  ],
  driver: [
    'qts',
    'cms_mm_per_N',
    'mms_g',
    'rms_kg_per_s',
    'bl_Tm',
    're_ohm',
    'efficiency_pct',
    'spl_1W_dB',
    'spl_2V83_dB',
    'nominal_ohm'
  ],
  alignment: ['net_L', 'effective_L', 'alpha', 'fc_Hz', 'qtc', 'f3_Hz', 'peak_dB', 'peak_Hz'],
  system: ['f3_Hz', 'f10_Hz', 'shaping_boost_dB', 'shaping_boost_Hz', 'boost_power_ratio'],
  demand: [
    'peak_V',
    'peak_A',
    'real_W',
    'apparent_VA',
    'rated_W_nominal',
    'cone_travel_mm',
    'cone_travel_Hz',
    'mains_average_W'
  ],
  exposure: ['level_dBA', 'hours', 'peak_dBC'],
  limiter: ['terminal_V', 'input_dBV'],
  room_doubt: ['doubt_dB', 'worst_margin_dB', 'best_margin_dB'],
  hot: ['rise_K', 're_ohm', 'qtc', 'level_loss_dB', 'holds']
};
const LEDGER = [
  'nominal_Hz',
  'f_Hz',
  'wanted_dB',
  'delivered_dB',
  'driver_box_dB',
  'shaping_dB',
  'room_dB',
  'distance_dB',
  'room_gain_dB',
  'copies_dB',
  'drive_V',
  'current_A',
  'real_W',
  'travel_mm',
  'margin_dB',
  'limit'
];

type Tree = { [key: string]: unknown };
const made = (over = {}): Tree => report(plan, chain, budget(over)) as unknown as Tree;

test.for(Object.entries(KEYS))('"%s" has its keys in their order', ([part, keys]) => {
  const tree = made();
  const here = Object.keys(part === '' ? tree : (tree[part] as Tree));
  expect(here.filter((key) => keys.includes(key))).toEqual(keys);
});

test('a ledger row and a limit have their keys', () => {
  const { ledger, limits } = made() as { ledger: Tree[]; limits: Tree[] };
  expect(Object.keys(ledger[0])).toEqual(LEDGER);
  expect(Object.keys(limits[2])).toEqual(['limit', 'worst_Hz', 'margin_dB', 'demanded_mm', 'allowed_mm']);
  expect(Object.keys(limits[0]).slice(3)).toEqual(['demanded_V', 'allowed_V']);
});

test('numbers are in the units of the file, unrounded, without the noise of the conversion', () => {
  const r = report(plan, chain, budget({ maxLevel: 107.123456789 }));
  expect(r.alignment.net_L).toBe(57.1);
  expect(r.driver.cms_mm_per_N).toBe(0.215);
  expect(r.driver.mms_g).toBe(294.6);
  expect(r.driver.efficiency_pct).toBe(0.31);
  expect(r.demand.cone_travel_mm).toBe(12.56);
  expect(r.ledger[0].travel_mm).toBe(12.1);
  expect(r.limits[2]).toEqual({
    limit: 'cone-travel',
    worst_Hz: 21,
    margin_dB: 2.1,
    demanded_mm: 12.56,
    allowed_mm: 16
  });
  expect(r.max_level_dB).toBe(107.123456789);
});

test('what does not exist is null, never NaN', () => {
  const exposure = { levelA: null, hours: Infinity, peakC: NaN, peakCAt: 45 };
  const r = report(
    plan,
    chain,
    budget({ exposure, system: { f3: null, f10: NaN, boost: 0, boostAt: 50, boostPower: 1 } })
  );
  expect(r.exposure).toMatchObject({ level_dBA: null, hours: null, peak_dBC: null });
  expect(r.system).toMatchObject({ f3_Hz: null, f10_Hz: null, shaping_boost_dB: 0 });
  expect(r.limiter.input_dBV).toBeNull();
});

describe('findings', () => {
  const way = {
    kind: 'level',
    changes: [{ set: 'level', value: 103.2 }],
    facts: { value: 103.2, before: 105, givesUp: 1.8 },
    marginAfter: 0.04,
    remaining: []
  } as const;
  const volume = {
    ...way,
    kind: 'volume',
    changes: [{ set: 'net-volume', value: 0.1 }],
    facts: { value: 0.1, before: 0.085 }
  } as const;
  const findings = [
    finding('margin-thin', { limit: 'cone-travel', margin: 2.1 }, { waysOut: [way, volume] })
  ];

  test('carry text, place and ways out as patches in the units of the file', () => {
    const [found] = report(plan, chain, budget({ findings })).findings;
    expect(found).toMatchObject({ code: 'margin-thin', severity: 'caution', at_Hz: 21 });
    expect(found.text).toContain('2.1 dB in hand');
    expect(found.ways_out.map((w) => w.change)).toEqual([
      [{ op: 'replace', path: '/goal/level_dB', value: 103.2 }],
      [{ op: 'replace', path: '/box/net_L', value: 100 }]
    ]);
    expect(found.ways_out[0].text).toMatch(/^Listen 1\.8 dB lower/);
  });
});

test('no text anywhere holds a slip of the pen', () => {
  const json = JSON.stringify(made());
  expect(json).not.toMatch(/NaN|undefined|\[object/);
});

test('a plan without a title is called so', () => {
  expect(report({ ...plan, title: undefined }, chain, budget()).title).toBe('Untitled plan');
});
