import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { formatProblem } from '$lib/plan/problem';
import { checkPlan, readPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { serialisePlan } from '$lib/plan/serialise-plan';
import { plausiblePlan, validPlan } from '../laws/valid-plan';
import { fullPlan } from './full-plan';

const problemsOf = (plan: unknown): string[] => {
  const result = checkPlan(plan);
  return result.ok ? [] : result.problems.map(formatProblem);
};

describe('a plan written and read again', () => {
  test.each([
    ['any valid plan', validPlan, 400],
    ['any plausible plan', plausiblePlan, 200]
  ])('%s is the same plan', (_, arbitrary, numRuns) => {
    fc.assert(
      fc.property(arbitrary, (plan: Plan) => {
        expect(problemsOf(plan)).toEqual([]);
        const text = serialisePlan(plan);
        const again = readPlan(text);
        if (!again.ok) throw new Error(again.problems.map(formatProblem).join('\n'));
        expect(again.plan).toEqual(plan);
        expect(serialisePlan(again.plan)).toBe(text);
      }),
      { numRuns, seed: 11 }
    );
  });

  test('random plans hold every key, every kind of block and room, every wiring', () => {
    const seen = new Set<string>();
    const look = (value: unknown, at = ''): void => {
      if (typeof value !== 'object' || value === null) return;
      for (const [key, inner] of Object.entries(value)) {
        const path = Array.isArray(value) ? at : `${at}/${key}`;
        if (inner !== null) seen.add(typeof inner === 'string' ? `${path}=${inner}` : path);
        look(inner, path);
      }
    };
    for (const plan of fc.sample(validPlan, { numRuns: 300, seed: 8 })) look(plan);
    const keys = new Set([...seen].map((path) => path.split('=')[0]));
    const wanted = new Set<string>();
    const collect = (value: unknown, at = ''): void => {
      if (typeof value !== 'object' || value === null) return;
      for (const [key, inner] of Object.entries(value)) {
        const path = Array.isArray(value) ? at : `${at}/${key}`;
        wanted.add(path);
        collect(inner, path);
      }
    };
    collect({ ...fullPlan(), box: { ...fullPlan().box, net_L: 85 } });
    expect([...wanted].filter((path) => !keys.has(path))).toEqual([]);
    for (const kind of 'low-pass high-pass linkwitz-transform low-shelf peak gain polarity delay all-pass section'.split(
      ' '
    ))
      expect(seen).toContain(`/shaping/kind=${kind}`);
    for (const choice of [
      ...[
        '/shaping/family=butterworth',
        '/shaping/family=linkwitz-riley',
        '/shaping/family=bessel',
        '/shaping/from_Hz=box'
      ],
      ...[
        '/room/kind=open-air',
        '/room/kind=pressure-gain',
        '/room/airtightness=tight',
        '/room/airtightness=leaky'
      ],
      ...['/driver/coil_wiring=single', '/driver/coil_wiring=series', '/driver/coil_wiring=parallel'],
      ...['/driver/driver_wiring=series', '/driver/driver_wiring=parallel', '/driver/facing=down']
    ])
      expect(seen).toContain(choice);
  });

  test('keys stand in the order of the file format, whatever order they came in', () => {
    const plan = fullPlan();
    const backwards = (value: unknown): unknown =>
      Array.isArray(value)
        ? value.map(backwards)
        : typeof value === 'object' && value !== null
          ? Object.fromEntries(
              Object.entries(value)
                .reverse()
                .map(([k, v]) => [k, backwards(v)])
            )
          : value;
    expect(Object.keys(backwards(plan) as object)[0]).toBe('seat');
    const text = serialisePlan(backwards(plan) as Plan);
    expect(text).toBe(serialisePlan(plan));
    // The order of the page that fixes the format.
    expect(Object.keys(JSON.parse(text))).toEqual(
      'format version title notes air goal programme copies shaping amplifier cable driver box room seat'.split(
        ' '
      )
    );
    expect(text.endsWith('}\n')).toBe(true);
    expect(text).toContain('\n  "title": "Loft corner",\n');
  });

  test('what was typed is what is stored: no default is filled in', () => {
    const plan: Plan = {
      format: 'sealwright-plan',
      version: 1,
      goal: { level_dB: 95, from_Hz: 30, to_Hz: 80 },
      amplifier: { ratings: [{ power_W: 100, load_ohm: 8 }] },
      driver: { fs_Hz: 30, qms: 4, qes: 0.5, vas_L: 60, re_ohm: 6, sd_cm2: 330 },
      box: { net_L: 40 },
      seat: { distance_m: 3 }
    };
    const read = readPlan(JSON.stringify(plan));
    expect(read.ok && read.plan).toEqual(plan);
  });
});
