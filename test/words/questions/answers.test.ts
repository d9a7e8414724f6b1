/** The sentences over the questions, on budgets made by hand. */
import { describe, expect, test } from 'vitest';
import { amplifierAnswer, boxAnswer } from '$lib/words/questions/answers';
import { doubtText, levelAnswer, limiterText } from '$lib/words/questions/level-answer';
import { plainText, unbroken, type Phrase } from '$lib/words/questions/phrases';
import { questionFigures } from '$lib/words/questions/question-figures';
import { amplifierTab, boxTab, levelTab } from '$lib/words/questions/tab-answers';
import { budget, chain, finding, limit } from '../specimen';
import { reportOf, sweepOf } from './sweep-by-hand';

const LITRES = [0.04, 0.06, 0.08, 0.1, 0.12];
const red = (phrases: readonly Phrase[]) => phrases.filter((p) => p.tone === 'over').map((p) => p.text);

/** The amplifier lacks volts: 60 V RMS of 44.7 V; 2 ohm makes that 1000 W of its own. */
const short = reportOf({
  limits: [
    limit('amplifier-voltage', -2.5, Math.sqrt(1000), Math.sqrt(1800)),
    limit('amplifier-current', 5, 11.2, 6.3),
    limit('cone-travel', -4.8, 0.016, 0.0277, 18)
  ],
  demand: { ...budget().demand, ratedW: 900 },
  maxLevel: 100.23
});

describe('how big a box', () => {
  const ask = (sweep: Parameters<typeof boxAnswer>[0]['sweep'], report = reportOf()) =>
    boxAnswer({ report, sweep, system: 'metric' });

  test('before the sweep it says what the plan asks', () => {
    // 47.3 V into the hand-made driver's 2 ohm are 1118.6 W.
    expect(plainText(ask(null))).toBe(
      'At 57.1 L net the box has Qtc 0.93, and the plan asks for 450 W into 2 ohm; the amplifier gives 1119 W.'
    );
  });

  test('from where it holds', () => {
    const sweep = sweepOf('net_L', LITRES, (v) => ({ 'cone-travel': (v - 0.055) * 200 }), { answer: 0.055 });
    expect(plainText(ask(sweep))).toMatch(/ Within limits from 55 L\.$/);
  });

  test('what no box cures, and by how little at best', () => {
    const sweep = sweepOf(
      'net_L',
      LITRES,
      (v) => ({ 'cone-travel': -5 + v, 'amplifier-voltage': (v - 0.09) * 100 }),
      { amplifierAnswer: 0.09 }
    );
    const said = ask(sweep, short);
    expect(plainText(said)).toBe(
      'At 57.1 L net the box has Qtc 0.93, and the plan asks for 900 W into 2 ohm; the amplifier gives 500 W. ' +
        'The amplifier is enough from 90 L. No box from 40 L to 120 L cures cone travel: at best still 4.9 dB over.'
    );
    expect(red(said)).toEqual(['900 W into 2 ohm', 'No box from 40 L to 120 L cures cone travel:']);
  });

  test('each limit curable, never all at once', () => {
    const sweep = sweepOf('net_L', LITRES, (v) => ({
      'cone-travel': (0.07 - v) * 100,
      'amplifier-voltage': (v - 0.09) * 100
    }));
    expect(plainText(ask(sweep))).toMatch(/No box from 40 L to 120 L is within every limit at once\.$/);
  });

  test('all of them', () => {
    expect(plainText(ask(sweepOf('net_L', LITRES, () => ({}))))).toMatch(
      /Every box from 40 L to 120 L is within limits\.$/
    );
  });

  test('in cubic feet of 28.3168 L', () => {
    const said = boxAnswer({ report: reportOf(), sweep: null, system: 'imperial' });
    expect(plainText(said)).toMatch(/^At 2\.02 cu ft net /);
  });

  test('a load too low stands in the way whatever the limits say', () => {
    const load = finding(
      'load-low',
      { nominal: 2, minimum: 4, loads: [] },
      { severity: 'blocking', at: null }
    );
    const said = ask(null, reportOf({ findings: [load] }));
    expect(red(said).join()).toMatch(/^The load of 2 ohm is below the amplifier's minimum load of 4 ohm\./);
  });
});

describe('how much amplifier', () => {
  const ask = (kind: 'transform' | 'shelf' | 'none', report = reportOf()) =>
    plainText(
      amplifierAnswer(
        { report, sweep: null, system: 'metric' },
        kind === 'none' ? { kind } : { kind, value: kind === 'shelf' ? 6 : 24 }
      )
    );

  test('a transform, a shelf, no boost', () => {
    const asks = 'asks for 450 W into 2 ohm; the amplifier gives 1119 W.';
    expect(ask('transform')).toBe(`Boost down to 24 Hz lifts 22 Hz by 6.0 dB and ${asks}`);
    expect(ask('shelf')).toBe(`A low shelf of 6.0 dB lifts 22 Hz by 6.0 dB and ${asks}`);
    expect(ask('none')).toBe(
      `The plan has no boost yet and ${asks} Moving the handle adds a transform to Q 0.707.`
    );
  });

  test('more watts do not mend a cone', () => {
    expect(ask('transform', short)).toMatch(
      /More watts alone will not help: at 18 Hz the cone would need 27\.7 mm of its 16 mm\.$/
    );
  });

  test('where amps run out and volts do not, amps are said', () => {
    const report = reportOf({
      limits: [
        limit('amplifier-voltage', 2, 47.3, 37.6),
        limit('amplifier-current', -1.9, 18, 22.4),
        limit('cone-travel', 3, 0.016, 0.011)
      ]
    });
    expect(ask('transform', report)).toMatch(/asks for 22\.4 A; the amplifier gives 18 A\.$/);
    expect(amplifierTab(report)).toBe('needs 22.4 A, has 18 A');
  });
});

describe('how loud', () => {
  test('first limit, next limit, what is wanted', () => {
    const said = levelAnswer({ report: short, chain });
    expect(plainText(said)).toBe(
      'Within limits up to 100.2 dB at the seat. There cone travel runs out first, at 18 Hz. ' +
        'The next limit is amplifier volts, at 102.5 dB. 105 dB is wanted: 4.8 dB too much.'
    );
    expect(red(said)).toEqual(['100.2 dB at the seat', '105 dB is wanted: 4.8 dB too much.']);
  });
  test('in hand', () => {
    expect(plainText(levelAnswer({ report: reportOf(), chain }))).toMatch(
      /^Within limits up to 107\.1 dB at the seat\. .*105 dB is wanted, with 2\.1 dB in hand\.$/
    );
  });
  test('the room, and the limiter rounded down', () => {
    const report = reportOf({
      roomDoubt: { doubt: 4, worstMargin: -1.9, bestMargin: 6.1 },
      limiter: { terminalV: 38.29, inputDbv: -0.31 }
    });
    expect(doubtText({ report, chain })).toBe(
      'The room is an estimate, good to 4 dB either way: the highest level lies between 103.1 dB and 111.1 dB.'
    );
    expect(doubtText({ report: reportOf(), chain })).toBe('');
    expect(limiterText(report)).toBe(
      "Set the limiter to 38.2 V RMS at the amplifier's terminals, which is −0.4 dBV at its input: it lets 107.1 dB through and no more."
    );
  });
});

test('tabs', () => {
  expect(boxTab(reportOf(), 'metric')).toBe('57.1 L net, Qtc 0.93');
  expect(amplifierTab(short)).toBe('needs 900 W, has 500 W');
  expect(levelTab(short)).toBe('within limits up to 100.2 dB');
});

test('a number keeps its unit on its line', () => {
  expect(unbroken('At 85 L and 2.02 cu ft, 4 dB at 20 Hz')).toBe(
    'At 85\u00a0L and 2.02\u00a0cu\u00a0ft, 4\u00a0dB at 20\u00a0Hz'
  );
});

describe('figures behind the plots', () => {
  test('of volume, with travel in the unit of the page', () => {
    const sweep = sweepOf('net_L', LITRES, () => ({ 'cone-travel': 1.26 }));
    const { columns, rows } = questionFigures(sweep, 'metric');
    expect(columns[0]).toMatchObject({ name: 'Net volume', unit: 'L' });
    expect(rows[1]).toEqual([
      ...['60.0', '0.80', '36.5', '17.3', '6.0', '961', '27.7', '1.3', 'cone travel', '18.0']
    ]);
    const inches = questionFigures(sweep, 'imperial');
    // 27.7 mm / 25.4 = 1.0906 in; 60 L / 28.3168 = 2.1189 cu ft.
    expect([inches.rows[1][0], inches.rows[1][6]]).toEqual(['2.12', '1.09']);
  });
  test('of level: a column for every limit that is judged', () => {
    const sweep = sweepOf('level_dB', [100, 105], (v) => ({ 'cone-travel': 101 - v }));
    const { columns, rows } = questionFigures(sweep, 'metric');
    expect(columns.map(({ name }) => name)).toEqual([
      'Level at the seat',
      'In hand, volts',
      'In hand, amps',
      'In hand, travel',
      'In hand, stop',
      'Tightest limit',
      'At'
    ]);
    expect(rows[1][3]).toBe('−4.0');
  });
});
