import { expect, test } from 'vitest';
import { cautions } from '$lib/words/cautions';
import { goalNote } from '$lib/words/goal-note';

const exposure = { levelA: 66, hours: 600, peakC: 107.44, peakCAt: 45 };

test('each caution defers to local rules and to those licensed or trained', () => {
  const texts = cautions(exposure);
  expect(texts.map((text) => text.split(':')[0])).toEqual([
    'Hearing',
    'Mains',
    'Lifting',
    'Dust',
    'Hanging loads'
  ]);
  for (const text of texts) expect(text).toMatch(/local|where you work/);
  expect(texts[1]).toMatch(/licensed electrician/);
  expect(texts[4]).toMatch(/licensed/);
});

test('hearing: the peak against the lower action value, and no comfort in hours', () => {
  expect(cautions(exposure)[0]).toContain('107.4 dB(C)');
  expect(cautions(exposure)[0]).toContain('below the 135 dB(C)');
  expect(cautions({ ...exposure, peakC: 135.2 })[0]).toContain('at or above the 135 dB(C)');
  expect(cautions(exposure).join(' ')).not.toContain('600');
});

test('beside the goal: what the level means', () => {
  expect(goalNote(102.5)).toMatch(/^102\.5 dB .*RMS.*3 dB higher.*105 dB peaks.*115 dB/);
});
