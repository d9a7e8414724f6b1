/** Patches are applied with a library outside the project, and the plan they make is read again. */
import fc from 'fast-check';
import { immutableJSONPatch, type JSONPatchDocument } from 'immutable-json-patch';
import { describe, expect, test } from 'vitest';
import type { Change } from '$lib/engine/budget/budget';
import { pointer, valueAt } from '$lib/plan/json-pointer';
import type { JsonPatch } from '$lib/plan/json-patch';
import { checkPlan } from '$lib/plan/read-plan';
import type { Plan } from '$lib/plan/schema';
import { toChain } from '$lib/plan/to-chain';
import { toPatch } from '$lib/plan/to-patch';
import { validPlan } from '../laws/valid-plan';
import { fullPlan } from './full-plan';

const apply = (plan: unknown, patch: JsonPatch): Plan =>
  immutableJSONPatch(plan, patch as JSONPatchDocument) as Plan;

/** Whether each operation finds what RFC 6902 asks it to find. */
function obeysTheStandard(plan: unknown, patch: JsonPatch): boolean {
  let at: unknown = plan;
  for (const operation of patch) {
    const keys = operation.path.split('/').slice(1);
    const holder = valueAt(at, keys.slice(0, -1));
    const last = keys[keys.length - 1];
    if (typeof holder !== 'object' || holder === null) return false;
    const there = Object.hasOwn(holder, last);
    const appends = Array.isArray(holder) && last === String(holder.length);
    if (operation.op === 'add' ? !(appends || (!Array.isArray(holder) && !there)) : !there) return false;
    at = apply(at, [operation]);
  }
  return true;
}

const least = (): Plan => ({
  format: 'sealwright-plan',
  version: 1,
  goal: { level_dB: 95, from_Hz: 30, to_Hz: 80 },
  amplifier: { ratings: [{ power_W: 100, load_ohm: 8 }] },
  driver: { fs_Hz: 30, qms: 4, qes: 0.5, vas_L: 60, re_ohm: 6, sd_cm2: 330 },
  box: { net_L: 40 },
  seat: { distance_m: 3 }
});

describe('changes as a patch', () => {
  test('the library says nothing of a replace or remove where nothing stands, so ours never asks for one', () => {
    const nothings: JsonPatch = [
      { op: 'replace', path: '/b', value: 1 },
      { op: 'replace', path: '/b/c', value: 1 },
      { op: 'replace', path: '/a/c', value: 1 },
      { op: 'remove', path: '/a/c' }
    ];
    for (const operation of nothings) {
      expect(apply({ a: {} }, [operation])).toEqual({ a: {} });
      expect(obeysTheStandard({ a: {} }, [operation])).toBe(false);
    }
  });

  test.each<[Change, JsonPatch]>([
    [{ set: 'level', value: 102.7 }, [{ op: 'replace', path: '/goal/level_dB', value: 102.7 }]],
    [{ set: 'goal-from', value: 23.5 }, [{ op: 'replace', path: '/goal/from_Hz', value: 23.5 }]],
    [{ set: 'goal-to', value: 70 }, [{ op: 'replace', path: '/goal/to_Hz', value: 70 }]],
    [
      { set: 'block-corner', block: 1, value: 18 },
      [{ op: 'replace', path: '/shaping/1/corner_Hz', value: 18 }]
    ],
    [
      { set: 'block-corner', block: 4, value: 33 },
      [{ op: 'replace', path: '/shaping/4/centre_Hz', value: 33 }]
    ],
    [{ set: 'block-to', block: 2, value: 26.5 }, [{ op: 'replace', path: '/shaping/2/to_Hz', value: 26.5 }]],
    [
      { set: 'block-gain', block: 3, value: 2.1 },
      [{ op: 'replace', path: '/shaping/3/gain_dB', value: 2.1 }]
    ],
    [
      { set: 'add-high-pass', order: 4, value: 17.5 },
      [
        {
          op: 'add',
          path: '/shaping/10',
          value: { kind: 'high-pass', family: 'butterworth', order: 4, corner_Hz: 17.5 }
        }
      ]
    ],
    [
      { set: 'drivers', count: 4, wiring: 'series' },
      [
        { op: 'replace', path: '/driver/count', value: 4 },
        { op: 'replace', path: '/driver/driver_wiring', value: 'series' }
      ]
    ],
    [
      { set: 'wiring', coilWiring: 'parallel', driverWiring: 'parallel' },
      [{ op: 'replace', path: '/driver/coil_wiring', value: 'parallel' }]
    ],
    [
      { set: 'ratings', powers: [640, 360] },
      [
        { op: 'replace', path: '/amplifier/ratings/0/power_W', value: 640 },
        { op: 'replace', path: '/amplifier/ratings/1/power_W', value: 360 }
      ]
    ],
    // 0.085·1000 is 85.00000000000001 in binary arithmetic: written clean.
    [
      { set: 'inner-volume', value: 0.085 * (1 + 2e-16) },
      [{ op: 'replace', path: '/box/inner_L', value: 85 }]
    ],
    [
      { set: 'net-volume', value: 0.085 },
      [
        { op: 'remove', path: '/box/inner_L' },
        { op: 'add', path: '/box/net_L', value: 85 }
      ]
    ],
    [{ set: 'cable', value: 0.021 }, [{ op: 'replace', path: '/cable/resistance_ohm', value: 0.021 }]]
  ])('%j of the full plan', (change, patch) => {
    expect(toPatch(fullPlan(), [change])).toEqual(patch);
    expect(checkPlan(apply(fullPlan(), patch)).ok).toBe(true);
  });

  test.each<[Change, JsonPatch]>([
    [
      { set: 'add-high-pass', order: 2, value: 20 },
      [
        {
          op: 'add',
          path: '/shaping',
          value: [{ kind: 'high-pass', family: 'butterworth', order: 2, corner_Hz: 20 }]
        }
      ]
    ],
    [{ set: 'cable', value: 0.02 }, [{ op: 'add', path: '/cable', value: { resistance_ohm: 0.02 } }]],
    [
      { set: 'drivers', count: 2, wiring: 'parallel' },
      [
        { op: 'add', path: '/driver/count', value: 2 },
        { op: 'add', path: '/driver/driver_wiring', value: 'parallel' }
      ]
    ],
    [{ set: 'drivers', count: 1, wiring: 'parallel' }, [{ op: 'add', path: '/driver/count', value: 1 }]],
    [{ set: 'wiring', coilWiring: 'single', driverWiring: 'parallel' }, []],
    [{ set: 'net-volume', value: 0.05 }, [{ op: 'replace', path: '/box/net_L', value: 50 }]]
  ])('%j of a plan that lacks the key', (change, patch) => {
    expect(toPatch(least(), [change])).toEqual(patch);
    expect(checkPlan(apply(least(), patch)).ok).toBe(true);
  });

  test('null stands for a parent that is lacking', () => {
    const plan = { ...least(), shaping: null, cable: null };
    const patch = toPatch(plan, [
      { set: 'add-high-pass', order: 2, value: 20 },
      { set: 'cable', value: 0.02 }
    ]);
    expect(patch.map((o) => o.op)).toEqual(['replace', 'replace']);
    expect(apply(plan, patch)).toMatchObject({
      shaping: [{ corner_Hz: 20 }],
      cable: { resistance_ohm: 0.02 }
    });
  });

  test('changes in a row find what the ones before them made', () => {
    const plan = least();
    const patch = toPatch(plan, [
      { set: 'add-high-pass', order: 2, value: 20 },
      { set: 'add-high-pass', order: 1, value: 15 },
      { set: 'block-corner', block: 0, value: 22 },
      { set: 'drivers', count: 2, wiring: 'parallel' },
      { set: 'wiring', coilWiring: 'single', driverWiring: 'series' }
    ]);
    expect(obeysTheStandard(plan, patch)).toBe(true);
    const made = apply(plan, patch);
    expect(made.shaping).toMatchObject([{ corner_Hz: 22 }, { corner_Hz: 15, order: 1 }]);
    expect(made.driver).toMatchObject({ count: 2, driver_wiring: 'series' });
    expect(plan).toEqual(least());
  });

  const change: fc.Arbitrary<Change> = fc.oneof(
    fc.record({ set: fc.constant('level' as const), value: fc.double({ min: 60, max: 120, noNaN: true }) }),
    fc.record({
      set: fc.constant('add-high-pass' as const),
      order: fc.constantFrom(1, 2, 4),
      value: fc.double({ min: 8, max: 30, noNaN: true })
    }),
    fc.record({
      set: fc.constant('drivers' as const),
      count: fc.constantFrom(1, 2, 4),
      wiring: fc.constantFrom('series' as const, 'parallel' as const)
    }),
    fc.record({
      set: fc.constant('net-volume' as const),
      value: fc.double({ min: 0.01, max: 4.9, noNaN: true })
    }),
    fc.record({ set: fc.constant('cable' as const), value: fc.double({ min: 0.001, max: 5, noNaN: true }) })
  );

  test('any changes of any valid plan: the chain of the patched file is the chain with the changes made', () => {
    fc.assert(
      fc.property(validPlan, fc.array(change, { minLength: 1, maxLength: 4 }), (plan, changes) => {
        const patch = toPatch(plan, changes);
        expect(obeysTheStandard(plan, patch)).toBe(true);
        const chain = toChain(apply(plan, patch));
        const last = <S extends Change['set']>(set: S) =>
          changes.findLast((c): c is Extract<Change, { set: S }> => c.set === set);
        const before = toChain(plan);
        expect(chain.goal.level).toBeCloseTo(last('level')?.value ?? before.goal.level, 7);
        expect(chain.cableResistance).toBeCloseTo(last('cable')?.value ?? before.cableResistance, 8);
        const volume = last('net-volume');
        if (volume) {
          expect(chain.box.net).toBeCloseTo(volume.value, 8);
          expect(chain.box.inner).toBeNull();
        } else expect(chain.box).toEqual(before.box);
        const drivers = last('drivers');
        if (drivers) expect(chain.driver.count).toBe(drivers.count);
        if (drivers && drivers.count > 1) expect(chain.driver.driverWiring).toBe(drivers.wiring);
        const added = changes.filter((c) => c.set === 'add-high-pass');
        expect(chain.shaping.length).toBe(before.shaping.length + added.length);
        added.forEach((c, i) => {
          const block = chain.shaping[before.shaping.length + i];
          expect(block.kind === 'high-pass' && block.corner).toBeCloseTo(c.value, 7);
        });
      }),
      { numRuns: 150, seed: 3 }
    );
  });
});

describe('JSON pointers', () => {
  // The examples of RFC 6901, section 5.
  test.each([
    [[], ''],
    [['foo', 0], '/foo/0'],
    [[''], '/'],
    [['a/b'], '/a~1b'],
    [['m~n'], '/m~0n'],
    [['c%d'], '/c%d']
  ] as [PropertyKey[], string][])('%j', (path, text) => expect(pointer(path)).toBe(text));
});
