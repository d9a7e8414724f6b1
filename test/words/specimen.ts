/** A budget made by hand, not by the engine: round numbers that are told apart at a glance. */
import type { Budget, Finding, LimitMargin, LimitName, WayOut } from '$lib/engine/budget/budget';
import type { Chain, DriverSheet } from '$lib/engine/chain';
import type { Plan } from '$lib/plan/schema';

export const sheet: DriverSheet = {
  count: 1,
  coils: 2,
  coilWiring: 'parallel',
  driverWiring: 'parallel',
  fs: 20,
  qms: 5,
  qes: 0.5,
  qts: null,
  vas: 0.2,
  re: 3.3,
  le: 0.001,
  l2: null,
  r2: null,
  sd: 0.081,
  nominal: 4,
  mms: null,
  cms: null,
  bl: null,
  rms: null,
  xmax: 0.016,
  xmech: 0.027,
  facing: null,
  coilRise: 150,
  power: 600,
  displacement: 0.0045
};

export const chain: Chain = {
  air: { temperature: 293.15, pressure: 101325 },
  goal: { level: 105, from: 20, to: 80, pivot: 50, tolerance: 3 },
  programme: { lowest: 10, crest: 9 },
  copies: 1,
  shaping: [],
  amplifier: {
    ratings: [{ power: 500, load: 4 }],
    gain: null,
    outputResistance: 0,
    minimumLoad: 4,
    efficiency: 0.85
  },
  cableResistance: 0.05,
  driver: sheet,
  box: { net: 0.085, inner: null, bracing: 0, fillGain: 1.1, qAbsorption: null, qLeakage: null },
  room: { kind: 'open-air', doubt: 0 },
  seatDistance: 3
};

export const plan: Plan = {
  format: 'sealwright-plan',
  version: 1,
  title: 'By hand',
  goal: { level_dB: 105, from_Hz: 20, to_Hz: 80 },
  amplifier: { ratings: [{ power_W: 500, load_ohm: 4 }] },
  driver: {
    coils: 2,
    coil_wiring: 'parallel',
    fs_Hz: 20,
    qms: 5,
    qes: 0.5,
    vas_L: 200,
    re_ohm: 3.3,
    sd_cm2: 810
  },
  box: { net_L: 85 },
  seat: { distance_m: 3 }
};

export const limit = (
  name: LimitName,
  margin: number,
  allowed: number,
  demanded: number,
  worst = 21
): LimitMargin => ({ limit: name, margin, allowed, demanded, worst });

export function budget(over: Partial<Budget> = {}): Budget {
  return {
    driver: {
      count: 1,
      fs: 20,
      qms: 5,
      qes: 0.5,
      qts: 0.4545,
      vas: 0.2,
      cms: 0.000215,
      mms: 0.2946,
      rms: 7.4,
      bl: 15.6,
      coil: { re: 1.65, le: 0.001, l2: 0, r2: 0 },
      sd: 0.081,
      nominal: 2,
      power: 600,
      xmax: 0.016,
      xmech: 0.027,
      displacement: 0.0045,
      displacementEstimated: false,
      efficiency: 0.0031,
      level1W: 87,
      level2V83: 93.9,
      each: {
        fs: 20,
        qms: 5,
        qes: 0.5,
        qts: 0.4545,
        vas: 0.2,
        cms: 0.000215,
        mms: 0.2946,
        rms: 7.4,
        bl: 15.6
      }
    },
    alignment: {
      net: 0.0571,
      effective: 0.0628,
      cab: 4.4e-7,
      alpha: 3.18,
      fc: 40.9,
      qec: 1.02,
      qmc: 10.2,
      qtc: 0.93,
      f3: 33.2,
      peak: 1.1,
      peakAt: 62
    },
    system: { f3: 17.34, f10: 12.1, boost: 6, boostAt: 22, boostPower: 3.98 },
    limits: [
      limit('amplifier-voltage', 4, 47.3, 30),
      limit('amplifier-current', 5, 11.2, 6.3),
      limit('cone-travel', 2.1, 0.016, 0.01256),
      limit('mechanical-stop', 6.65, 0.027, 0.01256),
      limit('coil-heat', 9, 20, 7.1)
    ],
    notJudged: [],
    verdict: { holds: true, margin: 2.1, limit: 'cone-travel', worst: 21 },
    maxLevel: 107.1,
    masterDrive: 11.8,
    demand: {
      peakV: 42.4,
      peakA: 8.9,
      realW: 160,
      apparentVA: 190,
      ratedW: 450,
      travel: 0.01256,
      travelAt: 21,
      mainsW: 47,
      terminalV: 30
    },
    goalShort: { short: 0, at: 20, beyondTolerance: false },
    findings: [],
    exposure: { levelA: 66.2, hours: 610, peakC: 107.4, peakCAt: 45 },
    limiter: { terminalV: 38.2, inputDbv: null },
    roomDoubt: { doubt: 0, worstMargin: 2.1, bestMargin: 2.1 },
    hot: {
      rise: 150,
      re: 2.62,
      qtc: 1.2,
      levelLoss: 2.5,
      margin: 1.4,
      limit: 'cone-travel',
      worst: 21,
      holds: true
    },
    ledger: [
      {
        nominal: 20,
        f: 19.95,
        wanted: 105,
        delivered: 104.2,
        driverBox: 72,
        shaping: 6,
        room: 5,
        distance: -4.8,
        roomGain: 9.8,
        copies: 0,
        driveV: 24,
        currentA: 6,
        realW: 120,
        travel: 0.0121,
        margin: 2.4,
        limit: 'cone-travel'
      }
    ],
    loads: [],
    ...over
  };
}

/** The budget with this one limit over and nothing else changed. */
export function overBy(
  name: LimitName,
  margin: number,
  allowed: number,
  demanded: number,
  maxLevel: number
): Budget {
  const worst = limit(name, margin, allowed, demanded);
  return budget({
    limits: budget().limits.map((l) => (l.limit === name ? worst : l)),
    verdict: { holds: false, margin, limit: name, worst: worst.worst },
    maxLevel
  });
}

type Parts = { severity?: Finding['severity']; at?: number | null; waysOut?: WayOut[] };

/** A finding from its code and facts. */
export const finding = (code: Finding['code'], facts: Finding['facts'], parts: Parts = {}): Finding =>
  ({ code, facts, severity: 'caution', at: 21, waysOut: [], ...parts }) as Finding;
