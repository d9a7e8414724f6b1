import { describe, expect, test } from 'vitest';
import { sentence } from '$lib/words/sentence';
import { budget, chain, finding, limit, overBy } from './specimen';

const say = (b = budget()): string => sentence(chain, b);

describe('a plan that holds', () => {
  test('says level, depth, margin, and what runs out first', () => {
    expect(say()).toBe(
      'Holds. 105 dB at the seat down to 17.3 Hz with 2.1 dB in hand. Cone travel runs out first, at 21 Hz.'
    );
  });

  test('leaves the depth out where there is none', () => {
    expect(say(budget({ system: { f3: null, f10: null, boost: 0, boostAt: 50, boostPower: 1 } }))).toBe(
      'Holds. 105 dB at the seat with 2.1 dB in hand. Cone travel runs out first, at 21 Hz.'
    );
  });

  test('says where the goal falls short', () => {
    expect(say(budget({ goalShort: { short: 6.02, at: 80, beyondTolerance: true } }))).toMatch(
      /^Holds, but falls 6\.0 dB short at 80 Hz\. 105 dB at the seat down to 17\.3 Hz with 2\.1 dB in hand\./
    );
  });

  test('a shortfall within the tolerance is not in it', () => {
    expect(say(budget({ goalShort: { short: 2.9, at: 80, beyondTolerance: false } }))).not.toContain('short');
  });

  test.for([
    { margin: 0.03, text: 'with under 0.1 dB in hand' },
    { margin: 0, text: 'with nothing in hand' }
  ])('a margin of $margin dB: $text', ({ margin, text }) => {
    expect(
      say(budget({ verdict: { holds: true, margin, limit: 'amplifier-voltage', worst: 18 } }))
    ).toContain(text);
  });

  test('volts are plural', () => {
    const verdict = { holds: true, margin: 1, limit: 'amplifier-voltage', worst: 8.04 } as const;
    expect(say(budget({ verdict }))).toContain('Amplifier volts run out first, at 8 Hz.');
  });

  test('limits that are not judged are said', () => {
    expect(say(budget({ notJudged: ['mechanical-stop', 'coil-heat'] }))).toMatch(
      /Not judged: cone's stop and coil heat\.$/
    );
  });

  test('the room can turn it', () => {
    const findings = [finding('room-doubt', { holds: true, doubt: 4, turnsAt: 1.2 })];
    expect(say(budget({ findings }))).toMatch(/holds unless the room gives 1\.2 dB less than estimated\.$/);
  });
});

describe('a plan that does not hold', () => {
  test.for([
    {
      ...overBy('cone-travel', -1.6735, 0.016, 0.0194, 103.3265),
      need: 'At 21 Hz the cone would need 19.4 mm of its 16 mm.'
    },
    {
      ...overBy('amplifier-voltage', -1.6735, 44.7, 54.2, 103.3265),
      need: 'At 21 Hz the amplifier would need 54.2 V of its 44.7 V.'
    },
    {
      ...overBy('amplifier-current', -1.6735, 11.2, 13.6, 103.3265),
      need: 'At 21 Hz the amplifier would need 13.6 A of its 11.2 A.'
    },
    {
      ...overBy('mechanical-stop', -1.6735, 0.027, 0.0327, 103.3265),
      need: 'At 21 Hz the cone would need 32.7 mm of the 27 mm to its stop.'
    },
    {
      ...overBy('coil-heat', -1.6735, 7.1, 8.6, 103.3265),
      need: 'At 21 Hz the coil would carry 8.6 A of the 7.1 A its heat allows.'
    }
  ])('$verdict.limit: $need', ({ need, ...over }) => {
    expect(say(over)).toBe(`Does not hold. ${need} 103.3 dB is the most; 105 dB is wanted.`);
  });

  test('a hair over is told apart, and never said to be nothing', () => {
    const text = say(overBy('cone-travel', -0.003, 0.016, 0.0160055, 104.997));
    expect(text).toContain('16.01 mm of its 16 mm, under 0.1 dB over.');
    expect(text).toContain('104.9 dB is the most; 105 dB is wanted.');
  });

  test('only another blocking finding: its fact', () => {
    const loads = [
      { coilWiring: 'series', driverWiring: 'parallel', nominal: 8, belowMinimum: false }
    ] as const;
    const findings = [
      finding('load-low', { nominal: 2, minimum: 4, loads }, { severity: 'blocking', at: null })
    ];
    expect(
      say(budget({ findings, verdict: { holds: false, margin: 2.1, limit: 'cone-travel', worst: 21 } }))
    ).toBe("Does not hold. The load of 2 ohm is below the amplifier's minimum load of 4 ohm.");
  });

  test('a doubt of the room is left out where something else blocks', () => {
    const blocking = finding(
      'load-low',
      { nominal: 2, minimum: 4, loads: [] },
      { severity: 'blocking', at: null }
    );
    const verdict = { holds: false, margin: 2.1, limit: 'cone-travel', worst: 21 } as const;
    for (const holds of [true, false]) {
      const findings = [blocking, finding('room-doubt', { holds, doubt: 4, turnsAt: 2.1 })];
      expect(say(budget({ findings, verdict }))).not.toContain('the room');
    }
  });

  test('the room could mend it', () => {
    const findings = [finding('room-doubt', { holds: false, doubt: 4, turnsAt: 1.67 })];
    const over = overBy('cone-travel', -1.67, 0.016, 0.0194, 103.33);
    expect(say({ ...over, findings })).toMatch(/would hold if the room gave 1\.7 dB more than estimated\.$/);
  });

  test('of several limits over it names the verdict’s', () => {
    const limits = [limit('amplifier-voltage', -1, 47, 53, 30), limit('cone-travel', -3, 0.016, 0.0226, 18)];
    const verdict = { holds: false, margin: -3, limit: 'cone-travel', worst: 18 } as const;
    expect(say(budget({ limits, verdict, maxLevel: 102 }))).toContain('At 18 Hz the cone would need 22.6 mm');
  });
});
