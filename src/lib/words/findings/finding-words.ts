/** A finding's code and facts in words. Each code has its sentences in the file of its subject. */
import type { Finding, LimitName } from '$lib/engine/budget/budget';
import * as amplifier from './amplifier';
import * as boost from './boost';
import * as box from './box';
import * as driver from './driver';
import * as limits from './limits';
import * as room from './room';
import type { Said } from './said';

export function findingWords(finding: Finding): Said {
  switch (finding.code) {
    case 'limit-amplifier-voltage':
    case 'limit-amplifier-current':
    case 'limit-cone-travel':
    case 'limit-mechanical-stop':
    case 'limit-coil-heat':
      return limits.limitOver(finding.code.slice('limit-'.length) as LimitName, finding.facts, finding);
    case 'not-judged':
      return limits.notJudged(finding.facts);
    case 'margin-thin':
      return limits.marginThin(finding.facts, finding);
    case 'infrasonic':
      return limits.infrasonic(finding.facts, finding);
    case 'hot-coil':
      return limits.hotCoil(finding.facts, finding);
    case 'room-doubt':
      return limits.roomDoubt(finding.facts);
    case 'boost-high':
      return boost.boostHigh(finding.facts, finding);
    case 'boost-short':
      return boost.boostShort(finding.facts, finding);
    case 'transform-large':
      return boost.transformLarge(finding.facts);
    case 'no-high-pass':
      return boost.noHighPass(finding.facts);
    case 'goal-short':
      return boost.goalShort(finding.facts, finding);
    case 'qtc-high':
    case 'qtc-low':
      return box.qtc(finding.code === 'qtc-high', finding.facts, finding);
    case 'air-spring':
      return box.airSpring(finding.facts);
    case 'losses-missing':
      return box.lossesMissing(finding.facts);
    case 'net-small':
      return box.netSmall(finding.facts);
    case 'displacement-estimated':
      return box.displacementEstimated(finding.facts);
    case 'alignment-differs':
      return box.alignmentDiffers(finding.facts);
    case 'driver-contradiction':
      return driver.driverContradiction(finding.facts);
    case 'driver-suspicious':
      return driver.driverSuspicious(finding.facts);
    case 'sag':
      return driver.sag(finding.facts);
    case 'load-low':
      return amplifier.loadLow(finding.facts);
    case 'cable-loss':
      return amplifier.cableLoss(finding.facts);
    case 'source-resistance':
      return amplifier.sourceResistance(finding.facts);
    case 'single-rating':
      return amplifier.singleRating(finding.facts, finding);
    case 'boundary-dip':
      return room.boundaryDip(finding.facts, finding);
    case 'exposure':
      return room.exposure(finding.facts, finding);
  }
}

/** The finding as one text. */
export function findingText(finding: Finding): string {
  const { fact, meaning } = findingWords(finding);
  return `${fact} ${meaning}`;
}
