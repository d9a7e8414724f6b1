/** A modest, well-matched chain in the open: nothing to remark on. Tests of findings disturb one thing at a time. All data invented. */
import type { Chain } from '$lib/engine/chain';

export const quietChain: Chain = {
  air: { temperature: 293.15, pressure: 101_325 },
  goal: { level: 92, from: 40, to: 80, pivot: 50, tolerance: 3 },
  programme: { lowest: 10, crest: 9 },
  copies: 1,
  shaping: [],
  amplifier: {
    ratings: [
      { power: 200, load: 8 },
      { power: 350, load: 4 }
    ],
    gain: null,
    outputResistance: 0,
    minimumLoad: 4,
    efficiency: 0.85
  },
  cableResistance: 0,
  driver: {
    count: 1,
    coils: 1,
    coilWiring: 'single',
    driverWiring: 'parallel',
    fs: 24,
    qms: 5,
    qes: 0.45,
    qts: null,
    vas: 0.1,
    re: 5.6,
    le: 0.3e-3,
    l2: null,
    r2: null,
    sd: 0.05,
    nominal: null,
    mms: null,
    cms: null,
    bl: null,
    rms: null,
    xmax: 12e-3,
    xmech: 20e-3,
    facing: 'side',
    coilRise: 100,
    power: 300,
    displacement: 3e-3
  },
  box: { net: 60e-3, inner: null, bracing: 0, fillGain: 1, qAbsorption: 30, qLeakage: 100 },
  room: { kind: 'open-air', doubt: 0 },
  seatDistance: 1
};
