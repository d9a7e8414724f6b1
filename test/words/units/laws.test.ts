/** What must be so of every number, quantity and unit. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { findUnit } from '$lib/words/units/find-unit';
import { parseQuantity } from '$lib/words/units/parse-quantity';
import { QUANTITIES, shownUnit, type Quantity } from '$lib/words/units/quantity';
import { quantityNumber } from '$lib/words/units/quantity-text';
import { stepQuantity } from '$lib/words/units/step-quantity';
import type { System } from '$lib/words/units/unit';

const ALL = Object.keys(QUANTITIES) as Quantity[];
const SYSTEMS: readonly System[] = ['metric', 'imperial'];
const anyQuantity = fc.constantFrom(...ALL);
const anySystem = fc.constantFrom(...SYSTEMS);

/** As a person types: up to seven digits, a decimal mark somewhere, never three digits behind one to three others. */
const typed = fc
  .record({ digits: fc.integer({ min: 1, max: 9_999_999 }), decimals: fc.integer({ min: 0, max: 6 }) })
  .map(({ digits, decimals }) => (digits / 10 ** decimals).toFixed(decimals))
  .filter((text) => !/^[1-9]\d{0,2}\.\d{3}$/.test(text));

const storedOf = (text: string, quantity: Quantity, system: System): number => {
  const parsed = parseQuantity(text, quantity, system);
  if (parsed.kind !== 'value') throw new Error(`${text} as ${quantity}: ${parsed.kind}`);
  return parsed.stored;
};

/** Of the gauge alone: so large a wire overflows. */
const LARGEST_GAUGE = 40;

test('what is typed in the stored unit is what is stored, to the last bit, with either decimal mark', () => {
  fc.assert(
    fc.property(anyQuantity, anySystem, typed, (quantity, system, text) => {
      const own = QUANTITIES[quantity].units.find((unit) => unit.stored)!;
      const withUnit = `${text} ${own.symbol}`;
      expect(storedOf(withUnit, quantity, system)).toBe(Number(text));
      expect(storedOf(withUnit.replace('.', ','), quantity, system)).toBe(Number(text));
    })
  );
});

test('a number in the stored unit is shown as it was typed', () => {
  fc.assert(
    fc.property(typed, (text) => {
      const shown = quantityNumber(Number(text), 'volume', 'metric');
      expect(Number(shown)).toBe(Number(text));
    })
  );
});

test('what is shown in another unit reads back within half a digit of what is stored', () => {
  const tried = ALL.filter((quantity) => quantity !== 'cross-section');
  fc.assert(
    fc.property(
      fc.constantFrom(...tried),
      fc.double({ min: 0.01, max: 5000, noNaN: true }),
      (quantity, x) => {
        const stored = Number(x.toPrecision(6));
        const shown = quantityNumber(stored, quantity, 'imperial').replace('−', '-');
        const unit = shownUnit(quantity, 'imperial');
        const exact = unit.fromStored(stored);
        // Four digits at the least: half of the last is 5e-4 of the first.
        expect(Math.abs(Number(shown) - exact)).toBeLessThanOrEqual(5.01e-4 * Math.abs(exact) + 1e-12);
      }
    )
  );
});

test('a short number typed in the shown unit comes back as typed', () => {
  const short = fc
    .record({ digits: fc.integer({ min: 1, max: 9999 }), decimals: fc.integer({ min: 0, max: 2 }) })
    .map(({ digits, decimals }) => digits / 10 ** decimals);
  fc.assert(
    fc.property(anyQuantity, anySystem, short, (quantity, system, value) => {
      fc.pre(quantity !== 'cross-section' || system === 'metric' || value <= LARGEST_GAUGE);
      const stored = storedOf(String(value), quantity, system);
      expect(quantityNumber(stored, quantity, system).replace('−', '-')).toBe(String(value));
    })
  );
});

test('nothing that is typed throws, and what is taken is a finite number', () => {
  const anything = fc.oneof(
    fc.string(),
    fc.stringMatching(/^[0-9 .,/'"eE+−-]{0,14}(cu ft|ft|in|Hz|mm|L|Ω|m²)?$/)
  );
  fc.assert(
    fc.property(anything, anyQuantity, anySystem, (text, quantity, system) => {
      const parsed = parseQuantity(text, quantity, system);
      if (parsed.kind === 'value') expect(Number.isFinite(parsed.stored)).toBe(true);
      if (parsed.kind === 'ask') expect(parsed.readings).toHaveLength(2);
      if (parsed.kind === 'refused') expect(parsed.sentence).toMatch(/\S\.$/);
    }),
    { numRuns: 2000 }
  );
});

describe('steps', () => {
  const range = { min: 0.01, max: 5000 };
  const value = fc.double({ min: 0.02, max: 4000, noNaN: true }).map((x) => Number(x.toPrecision(5)));

  test('go the right way, stay in range, and end in a short number', () => {
    fc.assert(
      fc.property(
        anyQuantity,
        anySystem,
        value,
        fc.boolean(),
        fc.boolean(),
        (quantity, system, from, up, large) => {
          fc.pre(quantity !== 'cross-section');
          const to = stepQuantity(from, { quantity, system, up, large, range });
          if (up) expect(to).toBeGreaterThan(from);
          else expect(to).toBeLessThan(from);
          if (to > range.min && to < range.max)
            expect(quantityNumber(to, quantity, system).replace(/\D/g, '').length).toBeLessThanOrEqual(7);
        }
      )
    );
  });

  test('a step up and a step down return to a round value', () => {
    fc.assert(
      fc.property(anySystem, fc.integer({ min: 1, max: 900 }), fc.boolean(), (system, tenths, large) => {
        const options = { quantity: 'length-large', system, large, range: null } as const;
        const round = stepQuantity(tenths, { ...options, up: true });
        const there = stepQuantity(round, { ...options, up: true });
        expect(stepQuantity(there, { ...options, up: false })).toBe(round);
      })
    );
  });
});

describe('the tables', () => {
  test.for(ALL)('%s: one stored unit, and every unit found by every name it has', (quantity) => {
    const { units } = QUANTITIES[quantity];
    expect(units.filter((unit) => unit.stored)).toHaveLength(1);
    for (const unit of units)
      for (const name of [unit.symbol, ...unit.names].filter((n) => n !== ''))
        expect([name, findUnit(name, quantity)?.symbol]).toEqual([name, unit.symbol]);
  });

  test.for(ALL)('%s: there and back is the same in every unit', (quantity) => {
    for (const unit of QUANTITIES[quantity].units)
      for (const x of [0.5, 1, 12, 37.5]) expect(unit.fromStored(unit.toStored(x))).toBeCloseTo(x, 8);
  });

  // International yard and pound agreement, 1959; the rest follows from it by multiplication.
  test.for<[Quantity, string, number]>([
    ['length-small', '1 in', 25.4],
    ['length-large', '1 ft', 0.3048],
    ['volume', '1 cu ft', 28.316846592],
    ['volume', '1 cu in', 0.016387064],
    ['area', '1 sq in', 6.4516],
    ['area', '1 sq ft', 929.0304],
    ['mass-large', '1 lb', 0.45359237],
    ['mass-small', '16 oz', 453.59237]
  ])('%s: %s is %d', ([quantity, text, stored]) => {
    expect(storedOf(text, quantity, 'metric')).toBe(stored);
  });

  // NIST Special Publication 811 (2008), appendix B.8.
  test.for<[string, number]>([
    ['1 psi', 6.894757],
    ['1 inHg', 3.386389],
    ['1 mmHg', 0.1333224]
  ])('pressure: %s is %d kPa', ([text, stored]) => {
    expect(storedOf(text, 'pressure', 'metric')).toBe(stored);
  });
});
