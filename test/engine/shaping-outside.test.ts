/**
 * Shaping blocks against circuits that do the same, in a general circuit simulator (ngspice): passive ladders from published tables, resonators,
 * one-amplifier circuits, lines and integrator loops, 5–500 Hz. Circuits with values typed from tables of four places are held to 0.02 dB and
 * 0.2°, all others to 0.001 dB and 0.01°. Sources stand beside the circuits in `test/spice/shaping-cases.ts` and `stages.ts`.
 */
import { beforeAll, describe, expect, test } from 'vitest';
import { cascadePhase, cascadePower, compileCascade } from '$lib/engine/shaping/cascade';
import { AcBench, degreesOf, modulus } from '../spice/run-ac';
import { butterworth, CASES, cookbookShelf, KINDS, lowShelf, pass, type Case } from '../spice/shaping-cases';
import { butterworthLadder, drive, inverter, stagesInRow } from '../spice/stages';
import { absolute, angle, Comparison } from '../tolerance';

/** What a transform bound to the box takes. */
const BOX = { fc: 40, qtc: 0.9 };
const COARSE = { db: absolute(0.02), phase: angle(0.2) };
const FINE = { db: absolute(0.001), phase: angle(0.01) };
const decibels = (amplitude: number): number => 20 * Math.log10(amplitude);

describe('the circuit simulator bears the shaping out', () => {
  let bench: AcBench;
  beforeAll(async () => {
    bench = await AcBench.start();
  }, 120_000);

  async function compare({ blocks, stages, rounded = false }: Case): Promise<Comparison> {
    const result = await bench.run([drive(), ...stagesInRow(stages)]);
    const cascade = compileCascade(blocks, BOX);
    const all = new Comparison();
    const due = result.of('v(out)');
    const { db, phase } = rounded ? COARSE : FINE;
    result.f.forEach((f, i) => {
      const at = `at ${f.toFixed(2)} Hz`;
      all.check(`dB ${at}`, 10 * Math.log10(cascadePower(cascade, f)), decibels(modulus(due[i])), db);
      all.check(`degrees ${at}`, (cascadePhase(cascade, f) * 180) / Math.PI, degreesOf(due[i]), phase);
    });
    return all;
  }

  test.for(CASES)('$name', async (one) => {
    const all = await compare(one);
    expect(all.misses, all.nearest).toEqual([]);
    expect(all.count).toBe(202);
  });

  test.for([2, 4, 6, 8])(
    'low and high side of Linkwitz–Riley order %i add up to an all-pass, in the circuit and here',
    async (order) => {
      const [low, high] = KINDS.map((kind) => {
        const half = butterworthLadder(kind, order / 2, 70);
        return order % 4 === 0 || kind === 'low-pass' ? [half, half] : [half, half, inverter];
      });
      const result = await bench.run([
        drive(),
        ...stagesInRow(low, 'low', 'in', 'p'),
        ...stagesInRow(high, 'high', 'in', 'q')
      ]);
      const sides = KINDS.map((kind) => compileCascade([pass(kind, 'linkwitz-riley', order, 70)], BOX));
      const turned = order % 4 === 0 ? 1 : -1;
      const all = new Comparison();
      const lows = result.of('v(low)');
      const highs = result.of('v(high)');
      result.f.forEach((f, i) => {
        const [a, b] = sides.map((c) => ({ size: Math.sqrt(cascadePower(c, f)), turn: cascadePhase(c, f) }));
        const mine = {
          re: a.size * Math.cos(a.turn) + turned * b.size * Math.cos(b.turn),
          im: a.size * Math.sin(a.turn) + turned * b.size * Math.sin(b.turn)
        };
        const due = { re: lows[i].re + highs[i].re, im: lows[i].im + highs[i].im };
        all.check(`circuit at ${f} Hz, dB`, decibels(modulus(due)), 0, COARSE.db);
        all.check(`engine at ${f} Hz, dB`, decibels(modulus(mine)), 0, absolute(1e-9));
        all.check(`sum at ${f} Hz, degrees`, degreesOf(mine), degreesOf(due), COARSE.phase);
      });
      expect(all.misses, all.nearest).toEqual([]);
    }
  );

  test('a corner one per cent off is noticed, and so is a Q', async () => {
    const off = { ...butterworth[3], blocks: [pass('low-pass', 'butterworth', 4, 45.45)] };
    expect((await compare(off)).misses.length).toBeGreaterThan(50);
    const q: Case = { name: '', blocks: [lowShelf(2, 35, 6, 1.11)], stages: [cookbookShelf(35, 6, 1.1)] };
    expect((await compare(q)).misses.length).toBeGreaterThan(50);
  });
});
