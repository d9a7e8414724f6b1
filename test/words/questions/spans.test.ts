/** Where limits are kept along a sweep: edges by straight lines on paper. */
import { describe, expect, test } from 'vitest';
import { AMPLIFIER, spans, spansText } from '$lib/words/questions/spans';
import { edgeText, edgeValue, sweptText } from '$lib/words/questions/swept-text';
import { suggestion } from '$lib/words/questions/suggestion';
import { sweepOf } from './sweep-by-hand';

/** 40, 60, 80, 100, 120 L; travel is over up to 55 L: −3 dB at 40 L, +1 dB at 60 L. */
const rising = sweepOf(
  'net_L',
  [0.04, 0.06, 0.08, 0.1, 0.12],
  (v) => ({ 'cone-travel': (v - 0.055) * 200 }),
  {
    answer: 0.055
  }
);

describe('spans', () => {
  test('an edge lies where the margin crosses zero', () => {
    const [one, ...rest] = spans(rising);
    expect(rest).toEqual([]);
    expect(one.from).toBeCloseTo(55, 9);
    expect(one).toMatchObject({ to: 120, openBelow: false, openAbove: true });
  });

  test('limits that are not asked for do not count', () => {
    expect(spans(rising, AMPLIFIER)).toEqual([{ from: 40, to: 120, openBelow: true, openAbove: true }]);
  });

  test('two stretches are two', () => {
    const margins = [-1, 1, -1, 1, 3];
    const sweep = sweepOf('boost_gain_dB', [0, 4, 8, 12, 16], (v) => ({
      'amplifier-voltage': margins[v / 4]
    }));
    expect(spans(sweep).map(({ from, to }) => [from, to])).toEqual([
      [2, 6],
      [10, 16]
    ]);
    expect(spansText(sweep, spans(sweep), null, 'metric')).toBe('from 2.0 dB to 6.0 dB and from 10.0 dB');
  });

  test('none is null, all of it is empty', () => {
    const never = sweepOf('net_L', [0.04, 0.06], () => ({ 'cone-travel': -1 }));
    const always = sweepOf('net_L', [0.04, 0.06], () => ({}));
    expect(spansText(never, spans(never), null, 'metric')).toBeNull();
    expect(spansText(always, spans(always), null, 'metric')).toBe('');
  });

  test('the answer of the sweep stands for the end it settles', () => {
    expect(spansText({ ...rising, answer: 0.056 }, spans(rising), 0.056, 'metric')).toBe('from 56 L');
  });

  test('of a boost, down to; of a level, up to', () => {
    const boost = sweepOf('boost_to_Hz', [20, 30, 40], (v) => ({ 'cone-travel': v - 24.3 }));
    expect(spansText(boost, spans(boost), null, 'metric')).toBe('down to 24.5 Hz');
    const level = sweepOf('level_dB', [90, 100, 110], (v) => ({ 'cone-travel': 100.27 - v }));
    expect(spansText(level, spans(level), null, 'metric')).toBe('up to 100.2 dB');
  });
});

test('edges go to the inside, whatever the unit', () => {
  expect(edgeText('net_L', 61.3, 'lower', 'metric')).toBe('62 L');
  expect(edgeText('net_L', 61.3, 'upper', 'metric')).toBe('61 L');
  expect(edgeText('net_L', 2.31, 'lower', 'metric')).toBe('2.4 L');
  // 61.3 L are 2.165 cubic feet of 28.3168 L.
  expect(edgeText('net_L', 61.3, 'lower', 'imperial')).toBe('2.2 cu ft');
  expect(edgeValue('net_L', 61.3, 'lower', 'imperial')).toBeCloseTo(2.2 * 28.316846592, 8);
  expect(sweptText('boost_gain_dB', -4, 'metric')).toBe('−4.0 dB');
});

describe('suggestion', () => {
  test('offers what holds, and says what it is', () => {
    expect(suggestion(rising, 85, 'metric')).toEqual({
      value: 55,
      act: 'Make it 55 L',
      outcome: 'the smallest box within limits'
    });
  });
  test('nothing where the plan is there already, or the answer is only the end of the range', () => {
    expect(suggestion(rising, 55, 'metric')).toBeNull();
    const always = sweepOf('net_L', [0.04, 0.06], () => ({}), { answer: 0.04 });
    expect(suggestion(always, 50, 'metric')).toBeNull();
  });
  test('where nothing holds, what the amplifier carries', () => {
    const sweep = sweepOf(
      'boost_to_Hz',
      [20, 30, 40],
      (v) => ({ 'cone-travel': -2, 'amplifier-voltage': v - 34.5 }),
      { amplifierAnswer: 34.5 }
    );
    expect(suggestion(sweep, 24, 'metric')).toEqual({
      value: 34.5,
      act: 'Boost down to 34.5 Hz',
      outcome: 'the most boost this amplifier carries'
    });
  });
});
