import fc from 'fast-check';
import { expect, test } from 'vitest';
import { marginReading, marginSize, marginText } from '$lib/words/margin-text';

test.for([
  { margin: 2.1, text: '2.1 dB in hand' },
  { margin: -0.03, text: 'under 0.1 dB over' },
  { margin: 0.03, text: 'under 0.1 dB in hand' },
  { margin: 1e-12, text: 'under 0.1 dB in hand' },
  { margin: -1e-12, text: 'under 0.1 dB over' },
  { margin: 0, text: 'nothing in hand' },
  { margin: -1.67, text: '1.7 dB over' },
  { margin: 2.97, text: '2.9 dB in hand' }
])('a margin of $margin dB reads "$text"', ({ margin, text }) => {
  expect(marginText(margin)).toBe(text);
});

test('no margin is rounded across zero, nor across 3 dB', () => {
  fc.assert(
    fc.property(fc.double({ min: -60, max: 60, noNaN: true }), (margin) => {
      const text = marginText(margin);
      expect(text.endsWith('over')).toBe(margin < 0);
      if (margin !== 0) expect(text).not.toMatch(/^0\.0 dB/);
      const shown = Number(marginSize(margin).replace('under ', ''));
      if (marginReading(margin) === 'thin') expect(shown).toBeLessThan(3);
      if (marginReading(margin) === 'in hand') expect(shown).toBeGreaterThanOrEqual(3);
    })
  );
});
