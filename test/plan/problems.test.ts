import { describe, expect, test } from 'vitest';
import { nearestKey } from '$lib/plan/nearest-key';
import { formatProblem, problem } from '$lib/plan/problem';
import { checkPlan, MOST_PROBLEMS, readPlan } from '$lib/plan/read-plan';
import { textSlip, unitSlip } from '$lib/plan/slips';
import { fullPlan, withValue } from './full-plan';

const first = (pointer: string, value: unknown): string => {
  const result = checkPlan(withValue(fullPlan(), pointer, value));
  return result.ok ? 'ok' : formatProblem(result.problems[0]);
};

describe('likely slips', () => {
  test.each([
    ['/driver/sd_cm2', 0.081, '0.081 looks like m²: 810 cm²?'],
    ['/driver/sd_cm2', 81000, '81000 looks like mm²: 810 cm²?'],
    ['/driver/xmax_mm', 0.016, '0.016 looks like m: 16 mm?'],
    ['/driver/vas_L', 0.09, '0.09 looks like m³: 90 L?'],
    ['/driver/vas_L', 220000, '220000 looks like cm³: 220 L?'],
    ['/driver/mms_g', 0.243, '0.243 looks like kg: 243 g?'],
    ['/driver/le_mH', 1800, '1800 looks like µH: 1.8 mH?'],
    ['/driver/cms_mm_per_N', 0.000236, '0.000236 looks like m/N: 0.236 mm/N?'],
    ['/amplifier/efficiency', 85, '85 looks like percent: 0.85?'],
    ['/amplifier/ratings/0/power_W', 0.05, '0.05 looks like kW: 50 W?'],
    ['/air/temperature_C', 293.15, '293.15 looks like K: 20 °C?'],
    ['/air/temperature_C', 68, '68 looks like °F: 20 °C?'],
    ['/air/pressure_kPa', 1013.25, '1013.25 looks like hPa: 101.325 kPa?'],
    ['/air/pressure_kPa', 101325, '101325 looks like Pa: 101.325 kPa?'],
    ['/seat/distance_m', 3000, '3000 looks like mm: 3 m?'],
    ['/room/length_m', 620, '620 looks like cm: 6.2 m?'],
    ['/box/fill_gain', 110, '110 looks like percent: 1.1?'],
    ['/driver/vas_L', -220, 'Without the minus sign: 220?']
  ])('%s %d', (pointer, value, hint) => {
    const line = first(pointer, value);
    expect(line.endsWith(` ${hint}`), line).toBe(true);
    expect(line).toMatch(new RegExp(`^${pointer}: -?[\\d.e-]+ is (below|above) what is allowed, `));
  });

  test('a unit hardly typed is offered only where no usual one fits', () => {
    // 0.05 could be ft³ (1.4 L) or m³ (50 L); the cubic metre wins. 0.004 as m³ is 4 L.
    expect(unitSlip(0.05, 'net_L', { min: 0.2, max: 5000 })).toContain('m³: 50 L');
    expect(unitSlip(0.05, 'net_L', { min: 1, max: 10 })).toContain('ft³');
    expect(unitSlip(1e9, 'fs_Hz', { min: 5, max: 200 })).toBeNull();
    expect(unitSlip(0, 'sd_cm2', { min: 5, max: 5000 })).toBeNull();
    expect(unitSlip(99, 'qms', { min: 0.2, max: 50 })).toBeNull();
  });

  test.each([
    ['21', 'fs_Hz', 'The number 21, without the quotation marks?'],
    ['21,5', 'fs_Hz', 'The number 21.5, without the quotation marks, with a decimal point?'],
    ['21 Hz', 'fs_Hz', 'The number 21, without the quotation marks, the unit, Hz, is in the key?'],
    ['−3', 'gain_dB', 'The number -3, without the quotation marks?'],
    ['box', 'fs_Hz', null],
    ['', 'fs_Hz', null],
    ['1.2.3', 'fs_Hz', null]
  ])('text %j for %s', (text, key, hint) => expect(textSlip(text, key)).toBe(hint));
});

describe('unknown keys', () => {
  test.each([
    ['/driver/vas_l', 'vas_L'],
    ['/driver/Fs_Hz', 'fs_Hz'],
    ['/driver/sd_m2', 'sd_cm2'],
    ['/driver/bl', 'bl_Tm'],
    ['/driver/xmax', 'xmax_mm'],
    ['/driver/coil_wireing', 'coil_wiring'],
    ['/goal/level', 'level_dB'],
    ['/goal/tolerence_dB', 'tolerance_dB'],
    ['/amplifier/ratings/0/power', 'power_W'],
    ['/shaping/4/center_Hz', 'centre_Hz'],
    ['/shaping/0/corner_hz', 'corner_Hz'],
    ['/room/distance_loss', 'distance_loss_dB'],
    ['/programm', 'programme'],
    ['/amp', 'air']
  ])('%s: the nearest is %s', (pointer, nearest) => {
    const key = pointer.split('/').at(-1);
    expect(first(pointer, 1)).toBe(
      `${pointer}: unknown key ${key}: the nearest known key is ${nearest}, or the file needs a newer Sealwright.`
    );
  });

  test.each(['build', 'circuit', 'mains', 'rooms', 'measured'])('%s is reserved', (key) => {
    expect(first(`/${key}`, {})).toBe(
      `/${key}: the key ${key} is reserved for a newer Sealwright: this file needs one.`
    );
    expect(first(`/driver/${key}`, {})).toContain('unknown key');
  });

  test('__proto__ is one like any other, at any depth, and changes nothing', () => {
    const text = JSON.stringify(fullPlan());
    for (const [find, pointer] of [
      ['{"format"', '/__proto__'],
      ['"driver":{', '/driver/__proto__'],
      ['{"kind":"polarity"', '/shaping/6/__proto__'],
      ['"ratings":[{', '/amplifier/ratings/0/__proto__']
    ] as const) {
      expect(text).toContain(find);
      const open = find.indexOf('{') + 1;
      const bad = text.replace(find, `${find.slice(0, open)}"__proto__":{"polluted":1},${find.slice(open)}`);
      const result = readPlan(bad);
      expect(result.ok).toBe(false);
      if (!result.ok) expect(result.problems.map((p) => p.path)).toEqual([pointer]);
    }
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });

  test('keys and text of a file cannot steer a terminal, nor break the line', () => {
    const line = first('/title\u001b[2J\n\u202e', 1);
    expect(line).not.toMatch(/[\p{Cc}\p{Cf}]/u);
    expect(line).toContain('\\u001b[2J');
    expect(first('/room/kind', 'a\nb\u001b')).not.toMatch(/\p{Cc}/u);
  });

  test('letter case and a shared word count little, the rest is counted in letters', () => {
    expect(nearestKey('VAS_l', ['vas_L', 'vat_l'])).toBe('vas_L');
    expect(nearestKey('corner', ['centre_Hz', 'corner_Hz', 'order'])).toBe('corner_Hz');
    expect(nearestKey('x', [])).toBeNull();
  });
});

describe('choices', () => {
  test.each([
    ['/driver/coil_wiring', 'serial', '"series"'],
    ['/driver/facing', 'sideways', '"side"'],
    ['/room/airtightness', 'Tight', '"tight"'],
    ['/room/kind', 'openair', '"open-air"'],
    ['/shaping/0/kind', 'lowpass', '"low-pass"'],
    ['/shaping/0/family', 'LR', '"bessel"|"linkwitz-riley"|"butterworth"'],
    ['/shaping/4/kind', 'Peak', '"peak"']
  ])('%s %j', (pointer, value, nearest) => {
    const line = first(pointer, value);
    expect(line).toContain(`${pointer}: "${value}" is not among what is allowed: `);
    expect(
      nearest.split('|').some((n) => line.endsWith(`The nearest is ${n}.`)),
      line
    ).toBe(true);
  });

  test('the kind left out', () => {
    expect(first('/shaping/0/kind', undefined)).toMatch(/^\/shaping\/0\/kind: missing: "low-pass", /);
    expect(first('/room/kind', null)).toMatch(
      /^\/room\/kind: null where "pressure-gain" or "open-air" belongs/
    );
    expect(first('/shaping/0', 5)).toMatch(/^\/shaping\/0: 5 /);
  });
});

describe('the list of problems', () => {
  test(`after ${MOST_PROBLEMS} the rest are counted`, () => {
    const plan = { ...fullPlan(), ...Object.fromEntries(Array.from({ length: 62 }, (_, i) => [`x${i}`, i])) };
    const result = checkPlan(plan);
    expect(result.ok).toBe(false);
    if (result.ok) return;
    expect(result.problems).toHaveLength(MOST_PROBLEMS + 1);
    expect(formatProblem(result.problems[MOST_PROBLEMS])).toBe('and 12 more problems.');
  });

  test('one line: path, message, hint', () => {
    const p = problem({ path: '/a', found: '1', allowed: '2', message: '1 is not 2.', hint: '2?' });
    expect(formatProblem(p)).toBe('/a: 1 is not 2. 2?');
    expect(formatProblem({ ...p, path: '', hint: null })).toBe('1 is not 2.');
  });
});
