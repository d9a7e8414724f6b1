/** Random chains for the laws of the engine, made from random plans; and plans strained until something gives. All data invented. */
import fc from 'fast-check';
import type { Chain } from '$lib/engine/chain';
import type { Plan } from '$lib/plan/schema';
import type { PlanBlock } from '$lib/plan/schema/blocks/blocks';
import { toChain } from '$lib/plan/to-chain';
import { plausiblePlan, validPlan } from './valid-plan';

/** Somebody could build it. */
export const plausibleChain: fc.Arbitrary<Chain> = plausiblePlan.map(toChain);

/** Anything the file allows, ends of every range included. */
export const extremeChain: fc.Arbitrary<Chain> = validPlan.map(toChain);

/** Both, so that no law holds for tame plans alone. */
export const anyChain: fc.Arbitrary<Chain> = fc.oneof(plausibleChain, extremeChain);

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const strain = fc.record({
  louder: between(-4, 14),
  tolerance_dB: fc.constantFrom(1, 3, 6),
  minimum_load_ohm: fc.option(fc.constantFrom(2, 4, 6, 8)),
  cable: fc.option(between(0.3, 2)),
  coil_rise_K: fc.constantFrom(0, 100, 150, 250),
  copies: fc.constantFrom(1, 1, 2),
  lowest_Hz: fc.constantFrom(5, 8, 10, 15, 18),
  moreShelf: fc.option(between(2, 10)),
  builtIn: fc.constantFrom(false, false, true)
});

/** Plausible plans asked for too much: louder, thin cables, loads the amplifier is not made for, content further down, more boost. */
export const strainedPlan: fc.Arbitrary<Plan> = fc.tuple(plausiblePlan, strain).map(([plan, s]): Plan => ({
  ...plan,
  goal: {
    ...plan.goal,
    level_dB: Number((plan.goal.level_dB + s.louder).toFixed(1)),
    tolerance_dB: s.tolerance_dB
  },
  programme: { ...plan.programme, lowest_Hz: s.lowest_Hz },
  copies: s.copies,
  amplifier: { ...plan.amplifier, minimum_load_ohm: s.minimum_load_ohm },
  cable: s.cable === null ? plan.cable : { resistance_ohm: s.cable },
  driver: { ...plan.driver, coil_rise_K: s.coil_rise_K },
  shaping: (plan.shaping ?? []).map((block): PlanBlock => {
    const held = { ...block, fixed: s.builtIn };
    return held.kind === 'low-shelf' ? { ...held, gain_dB: held.gain_dB + (s.moreShelf ?? 0) } : held;
  })
}));
