/** The closed box and the load it makes. */
import { describe, expect } from 'vitest';
import { curves } from '$lib/engine/budget/curves';
import { evaluate } from '$lib/engine/budget/evaluate';
import { logGrid } from '$lib/engine/quantity/grid';
import { anyChain, extremeChain } from './chain-arbitrary';
import { close, law, near } from './law';

/** |H|² of a second-order high-pass at x = f/fc. */
const highPass = (x: number, q: number): number => x ** 4 / ((1 - x * x) ** 2 + (x / q) ** 2);

/** Where it comes up to half power, found without the closed form: it crosses once, whatever the Q. */
function halfPower(q: number): number {
  let [low, high] = [0.1, 1e6];
  for (let i = 0; i < 80; i++) {
    const middle = Math.sqrt(low * high);
    if (highPass(middle, q) < 0.5) low = middle;
    else high = middle;
  }
  return high;
}

describe('alignment', () => {
  // Small, "Closed-Box Loudspeaker Systems, Part I", JAES 20(10), 1972.
  law(
    'f3 over fc is that of a second-order high-pass of this Qtc, and depends on Qtc alone',
    anyChain,
    100,
    (chain) => {
      const { f3, fc, qtc } = evaluate(chain, { waysOut: false }).alignment;
      near(f3 / fc, halfPower(qtc), 1e-9, `f3/fc at Qtc ${qtc}`);
    }
  );

  law('the peak is the highest point of that high-pass, or there is none', anyChain, 100, (chain) => {
    const { peak, peakAt, fc, qtc } = evaluate(chain, { waysOut: false }).alignment;
    if (qtc <= Math.SQRT1_2) {
      expect(peak).toBe(0);
      expect(peakAt).toBeNull();
      return;
    }
    const x = (peakAt as number) / fc;
    close(10 * Math.log10(highPass(x, qtc)), peak, 1e-9, 'height');
    for (const off of [0.98, 0.999, 1.001, 1.02])
      expect(highPass(x * off, qtc)).toBeLessThanOrEqual(highPass(x, qtc) * (1 + 1e-12));
  });
});

describe('load at the amplifier', () => {
  const grid = logGrid(1, 2000, 200);
  law('takes power at every frequency: never less than coil and cable take', extremeChain, 150, (chain) => {
    const { driver } = evaluate(chain, { waysOut: false });
    const c = curves(chain, grid);
    const least = driver.coil.re + chain.cableResistance;
    grid.forEach((f, i) => {
      const real = c.impedance[i] * Math.cos((c.impedancePhase[i] * Math.PI) / 180);
      // The angle is rounded near 90 degrees, where its cosine is a small difference.
      if (!(real > least - 1e-12 * c.impedance[i]))
        throw new Error(`Re Z ${real} under ${least} ohm at ${f} Hz`);
      expect(Math.abs(c.impedancePhase[i])).toBeLessThan(90);
    });
  });
});
