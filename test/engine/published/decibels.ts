/** Decibels, power, programme, hearing: numbers 65–74 of the published checks. */
import { amplifierCeiling } from '$lib/engine/amplifier/ceiling';
import { evaluate } from '$lib/engine/budget/evaluate';
import { exposure } from '$lib/engine/budget/exposure';
import { coilHeat } from '$lib/engine/budget/limits/coil-heat';
import { equivalentDriver } from '$lib/engine/driver/equivalent';
import { fromDb, powerFromDb, SINE_CREST, toDb } from '$lib/engine/quantity/decibel';
import { weightingA } from '$lib/engine/quantity/weighting';
import { roomResponse } from '$lib/engine/room/room';
import { absolute, percent, share } from '../../tolerance';
import { one, rowsOf, type CheckRow } from './check-row';
import { ROOM_AIR, worked, workedChain } from './worked-chain';

const DEFINITION = 'definition';
const OHM = "Ohm's law";
const PRACTICE = 'common practice';
const INVERSE_SQUARE = 'inverse-square law';
const WEIGHTING =
  'IEC 61672-1, Sound level meters – Part 1, 2013, frequency-weighting table (from memory, reproduced by its formula)';
const NIOSH =
  'NIOSH, Criteria for a Recommended Standard: Occupational Noise Exposure, Publication 98-126, 1998 (from memory)';

const bridge = amplifierCeiling([{ power: 500, load: 4 }]);

/** dB that √8 V gives over 1 W into this Re. */
function overOneWatt(re: number): number {
  const driver = equivalentDriver(workedChain({ driver: { re } }).driver, ROOM_AIR);
  return driver.level2V83 - driver.level1W;
}

/** Steady watts the heat limit lets into the coil's Re, of a rating of 100 W. */
function steadyHeat(crest: number): number {
  const w = worked({ driver: { power: 100 }, chain: { programme: { lowest: 10, crest } } });
  return (coilHeat.allowed(w) ?? NaN) ** 2 * w.driver.coil.re;
}

/** A plan whose shaping lifts 15 dB at 10 Hz and nothing to speak of at its pivot. */
function boostOfFifteen() {
  const chain = workedChain({
    chain: {
      programme: { lowest: 1, crest: 9 },
      goal: { level: 90, from: 20, to: 200, pivot: 200, tolerance: 20 },
      shaping: [{ kind: 'peak', centre: 10, q: 8, gain: 15, bypass: false, fixed: false }]
    }
  });
  return evaluate(chain, { waysOut: false }).system;
}

/** Hours at a long-term A-weighted level: a 50 Hz ledger row made as loud as that. */
function hoursAt(levelA: number): number {
  const w = worked();
  const row = evaluate(w.chain, { waysOut: false }).ledger.find((r) => r.nominal === 50);
  if (row === undefined) return NaN;
  const delivered = levelA - weightingA(row.f) + (w.chain.programme.crest - SINE_CREST);
  return exposure(w, [{ ...row, delivered }]).hours ?? NaN;
}

export const decibels: readonly CheckRow[] = [
  one(65, '15 dB of boost, times the power', 31.623, percent(0.05), PRACTICE, () => powerFromDb(15)),
  one(65, '15 W with 15 dB of boost, W', 474.3, percent(0.05), PRACTICE, () => 15 * powerFromDb(15)),
  one(
    65,
    'power a plan pays for a 15 dB peak, times',
    31.623,
    percent(0.05),
    PRACTICE,
    () => boostOfFifteen().boostPower
  ),
  one(66, 'twice the power, dB', 3.0103, absolute(1e-4), DEFINITION, () => toDb(Math.SQRT2)),
  one(66, 'ten times the power, dB', 10, absolute(1e-4), DEFINITION, () => toDb(Math.sqrt(10))),
  one(66, '6 dB, times the power', 3.9811, absolute(1e-4), DEFINITION, () => powerFromDb(6)),
  one(67, '500 W into 4 Ω, V RMS', 44.721, percent(0.01), OHM, () => bridge.volts),
  one(67, '500 W into 4 Ω, A RMS', 11.18, percent(0.01), OHM, () => bridge.amps),
  one(67, '500 W into 4 Ω, V peak', 63.246, percent(0.01), OHM, () => bridge.volts * fromDb(SINE_CREST)),
  one(67, '500 W into 4 Ω, A peak', 15.811, percent(0.01), OHM, () => bridge.amps * fromDb(SINE_CREST)),
  one(68, '√8 V into 8 Ω re 1 W, dB', 0, absolute(1e-9), DEFINITION, () => overOneWatt(8)),
  one(68, '√8 V into 4 Ω re 1 W, dB', 3.0103, absolute(1e-4), DEFINITION, () => overOneWatt(4)),
  one(69, 'crest of a sine, dB', 3.0103, absolute(1e-3), DEFINITION, () => SINE_CREST),
  one(
    69,
    'steady heat allowed at the crest of a sine, of a rating of 100 W, W',
    100,
    share(1e-4),
    DEFINITION,
    () => {
      return steadyHeat(SINE_CREST);
    }
  ),
  one(69, 'steady heat allowed at 12 dB crest re 3.01 dB, times', 7.924, absolute(1e-3), DEFINITION, () => {
    return steadyHeat(12) / steadyHeat(SINE_CREST);
  }),
  one(69, 'heat at 12 dB crest re a steady tone, dB', -8.9897, absolute(1e-3), DEFINITION, () => {
    return 10 * Math.log10(steadyHeat(SINE_CREST) / steadyHeat(12));
  }),
  one(70, 'twice the distance in the open, dB', -6.0206, absolute(1e-4), INVERSE_SQUARE, () => {
    const at = (metres: number) => roomResponse({ kind: 'open-air', doubt: 0 }, metres, 343).distance;
    return at(6) - at(3);
  }),
  ...rowsOf<number>(
    {
      number: 71,
      what: 'A-weighting, dB, at 10^(k/10) Hz, k =',
      tolerance: absolute(0.05),
      source: WEIGHTING
    },
    [
      [10, -70.4],
      [11, -63.4],
      [12, -56.7],
      [13, -50.5],
      [14, -44.7],
      [15, -39.4],
      [16, -34.6]
    ],
    (k) => weightingA(10 ** (k / 10))
  ),
  ...rowsOf<number>(
    { number: 71, what: 'A-weighting by the formula, dB, k =', tolerance: absolute(6e-4), source: WEIGHTING },
    [
      [10, -70.43],
      [11, -63.371],
      [12, -56.688],
      [13, -50.452],
      [14, -44.703],
      [15, -39.44],
      [16, -34.63]
    ],
    (k) => weightingA(10 ** (k / 10))
  ),
  ...rowsOf<number>(
    {
      number: 72,
      what: 'A-weighting, dB, at 10^(k/10) Hz, k =',
      tolerance: absolute(0.05),
      source: WEIGHTING
    },
    [
      [17, -30.2],
      [18, -26.2],
      [19, -22.5],
      [20, -19.1],
      [21, -16.1],
      [22, -13.4],
      [23, -10.9]
    ],
    (k) => weightingA(10 ** (k / 10))
  ),
  ...rowsOf<number>(
    { number: 72, what: 'A-weighting by the formula, dB, k =', tolerance: absolute(6e-4), source: WEIGHTING },
    [
      [17, -30.228],
      [18, -26.194],
      [19, -22.504],
      [20, -19.143],
      [21, -16.098],
      [22, -13.35],
      [23, -10.87]
    ],
    (k) => weightingA(10 ** (k / 10))
  ),
  one(73, 'A-weighting at 1 kHz, dB', 0, absolute(0.001), WEIGHTING, () => weightingA(1000)),
  ...rowsOf<number>(
    { number: 74, what: 'hours at dB(A)', tolerance: share(1e-9), source: NIOSH },
    [
      [85, 8],
      [88, 4],
      [91, 2],
      [94, 1],
      [100, 0.25],
      [103, 0.125]
    ],
    hoursAt
  )
];
