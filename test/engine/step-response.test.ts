import { expect, test } from 'vitest';
import { readFileSync } from 'node:fs';
import { stepResponse } from '$lib/engine/budget/step-response';
import { workOut } from '$lib/engine/budget/workings';
import { toChain } from '$lib/plan/to-chain';

const plan = JSON.parse(
  readFileSync(new URL('../reference/public/bare-lawn.sealwright.json', import.meta.url), 'utf8')
);
const bare = toChain(plan);

test('a closed box alone: the step of a second-order high-pass, closed form (any textbook of circuit theory)', () => {
  const chain = { ...bare, shaping: [], driver: { ...bare.driver, le: 0, l2: null, r2: null } };
  const { fc, qtc } = workOut(chain).alignment;
  const w0 = 2 * Math.PI * fc;
  const decay = w0 / (2 * qtc);
  const ring = Math.sqrt(w0 * w0 - decay * decay);
  expect(qtc).toBeGreaterThan(0.5);
  // The response at the pivot of that high-pass, to which the step is relative.
  const x = chain.goal.pivot / fc;
  const atPivot = (x * x) / Math.hypot(1 - x * x, x / qtc);
  const { t, y } = stepResponse(chain, 0.2, 401);
  // After the faded-out top of the band (2 ms) has settled.
  for (let i = 0; i < t.length; i++) {
    if (t[i] < 0.004) continue;
    const closed = Math.exp(-decay * t[i]) * (Math.cos(ring * t[i]) - (decay / ring) * Math.sin(ring * t[i]));
    expect(Math.abs(y[i] - closed / atPivot)).toBeLessThan(0.01);
  }
});

test('polarity turns it over', () => {
  const upright = stepResponse({ ...bare, shaping: [] }, 0.1, 51).y;
  const turned = stepResponse(
    { ...bare, shaping: [{ kind: 'polarity', bypass: false, fixed: false }] },
    0.1,
    51
  ).y;
  upright.forEach((v, i) => expect(turned[i]).toBeCloseTo(-v, 9));
});
