/** What a data sheet contradicts or makes suspicious, each sentence beside the key it is about: the words of the findings. */
import {
  contradictions,
  suspicions,
  type RedundantKey,
  type Suspicion
} from '$lib/engine/driver/sheet-check';
import { EngineError } from '$lib/engine/error';
import type { Plan } from '$lib/plan/schema';
import { driverSheet } from '$lib/plan/to-chain';
import { driverContradiction, driverSuspicious } from '$lib/words/findings/driver';
import type { Said } from '$lib/words/findings/said';
import type { DriverKey } from './driver-sheet';

const OF_CONTRADICTION: { readonly [K in RedundantKey]: DriverKey } = {
  qts: 'qts',
  mms: 'mms_g',
  cms: 'cms_mm_per_N',
  bl: 'bl_Tm',
  rms: 'rms_kg_per_s'
};

/** Where someone would look first. */
const OF_SUSPICION: { readonly [W in Suspicion['what']]: DriverKey } = {
  'area-size': 'sd_cm2',
  'xmax-large': 'xmax_mm',
  'xmech-close': 'xmech_mm',
  'mass-area': 'mms_g',
  'nominal-re': 'nominal_ohm',
  'qts-range': 'qts',
  'inductance-large': 'le_mH',
  'efficiency-range': 'vas_L'
};

/** By key; the same sentences as the report's `driver-contradiction` and `driver-suspicious`. */
export function driverMarks(plan: Plan): ReadonlyMap<DriverKey, string> {
  const marks = new Map<DriverKey, string>();
  const mark = (key: DriverKey, { fact, meaning }: Said) => {
    const before = marks.get(key);
    marks.set(key, `${before === undefined ? '' : `${before} `}${fact} ${meaning}`);
  };
  const sheet = driverSheet(plan.driver);
  try {
    for (const found of contradictions(sheet)) mark(OF_CONTRADICTION[found.key], driverContradiction(found));
    for (const found of suspicions(sheet)) mark(OF_SUSPICION[found.what], driverSuspicious(found));
  } catch (trouble) {
    if (!(trouble instanceof EngineError)) throw trouble;
  }
  return marks;
}
