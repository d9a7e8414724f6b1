/** The box: its alignment, its losses, its air as a spring, and what the driver leaves of it. Thresholds: common practice, no source. */
import { circuitPoint, passbandPressure, solveCircuit } from '../../box/circuit';
import { bisect } from '../../quantity/search';
import type { Finding } from '../budget';
import { volumeForQtc } from '../ways-out/volume';
import { withHotCoil, type Workings } from '../workings';
import { finding, type Context } from './context';

const QTC = { cautionLow: 0.5, low: 0.6, high: 0.8, cautionHigh: 0.9, peaky: 1.2 };
/** Maximally flat first; lower where the hot coil would still be boomy. */
const TARGETS = [Math.SQRT1_2, 0.66, 0.62];

/** Nothing left to remark on, cold or hot. */
const wellAligned = (w: Workings): boolean =>
  w.alignment.qtc >= QTC.low && w.alignment.qtc <= QTC.high && withHotCoil(w).alignment.qtc <= QTC.peaky;

export function qtc({ w, figures, solve }: Context): Finding[] {
  const { qtc: cold, peak, peakAt } = w.alignment;
  const hotQtc = figures.hot.qtc;
  const facts = { qtc: cold, hotQtc, peak, peakAt };
  const ways = () => solve(() => [volumeForQtc(w, TARGETS, wellAligned)]);
  if (cold < QTC.low)
    return [finding({ code: 'qtc-low', facts }, cold < QTC.cautionLow ? 'caution' : 'note', null, ways())];
  if (cold > QTC.high)
    return [
      finding({ code: 'qtc-high', facts }, cold > QTC.cautionHigh ? 'caution' : 'note', peakAt, ways())
    ];
  // Well aligned cold, but boomy once the coil is hot.
  return hotQtc > QTC.peaky ? [finding({ code: 'qtc-high', facts }, 'note', peakAt)] : [];
}

export function losses({ w }: Context): Finding[] {
  const { qAbsorption, qLeakage, fillGain } = w.chain.box;
  if (qAbsorption !== null && qLeakage !== null) return [];
  return [
    finding(
      {
        code: 'losses-missing',
        facts: {
          qtc: w.alignment.qtc,
          fill: fillGain > 1,
          absorption: qAbsorption === null,
          leakage: qLeakage === null
        }
      },
      'note'
    )
  ];
}

/** Share of the box's air the cone moves, peak: from here a note, from twice that a caution. */
const AIR_SHARE_NOTE = 0.05;
/** Second harmonic of the box's share over Vd/Vb: (γ+1)/4 of the adiabatic series. */
const SECOND_HARMONIC = 0.6;

export function airSpring({ w, figures }: Context): Finding[] {
  const share = (w.driver.sd * figures.demand.travel) / w.alignment.net;
  if (!(share > AIR_SHARE_NOTE)) return [];
  return [
    finding(
      { code: 'air-spring', facts: { share, secondHarmonic: SECOND_HARMONIC * share } },
      share > 2 * AIR_SHARE_NOTE ? 'caution' : 'note',
      figures.demand.travelAt
    )
  ];
}

export function netSmall({ w }: Context): Finding[] {
  const { net } = w.alignment;
  const { displacement, displacementEstimated: estimated } = w.driver;
  const found: Finding[] = [];
  if (net < displacement)
    found.push(finding({ code: 'net-small', facts: { net, displacement, estimated } }, 'caution'));
  if (estimated && w.chain.box.inner !== null)
    found.push(
      finding(
        {
          code: 'displacement-estimated',
          facts: { each: displacement / w.driver.count, total: displacement }
        },
        'note'
      )
    );
  return found;
}

/** −3 dB point of the full circuit re the alignment's passband, without shaping or room; null where it never gets there. */
function circuitF3(w: Workings): number | null {
  const half = passbandPressure(w.circuit) ** 2 / 2;
  const point = circuitPoint();
  const below = (f: number): boolean => {
    solveCircuit(w.circuit, f, point);
    return point.pRe * point.pRe + point.pIm * point.pIm <= half;
  };
  const { fc, f3 } = w.alignment;
  let above = 2 * Math.max(fc, f3);
  if (below(above)) return null;
  for (let f = above / 1.05; f > fc / 10; f /= 1.05) {
    if (below(f)) return bisect(below, above, f, f * 1e-6);
    above = f;
  }
  return null;
}

const ALIGNMENT_DIFFERS = 0.05;

/** Where inductance or a leak pulls the full response away from the alignment. */
export function alignmentDiffers({ w }: Context): Finding[] {
  const actual = circuitF3(w);
  const { f3 } = w.alignment;
  if (actual !== null && Math.abs(actual / f3 - 1) <= ALIGNMENT_DIFFERS) return [];
  return [
    finding({ code: 'alignment-differs', facts: { alignmentF3: f3, circuitF3: actual } }, 'note', actual)
  ];
}
