/** Each question's answer as it stands, short enough for a tab. */
import { qText, safeLevelText } from '../quantities';
import type { Report } from '../report';
import { roundedText } from '../units/quantity-text';
import type { System } from '../units/unit';
import { amplifierNeed } from './amplifier-need';

export const QUESTION_NAMES = {
  volume: 'How big a box?',
  boost: 'How much amplifier?',
  level: 'How loud can it go?'
} as const;

/** "85 L net, Qtc 0.82". */
export function boxTab({ alignment }: Report, system: System): string {
  const { net_L: net, qtc } = alignment;
  if (net === null || qtc === null) return 'not known';
  return `${roundedText(net, 'volume', system)} net, Qtc ${qText(qtc)}`;
}

/** "needs 961 W, has 500 W". */
export function amplifierTab(report: Report): string {
  const { needs, has } = amplifierNeed(report);
  return `needs ${needs}, has ${has}`;
}

/** "within limits up to 100.2 dB". */
export const levelTab = ({ max_level_dB: most }: Report): string =>
  most === null ? 'not known' : `within limits up to ${safeLevelText(most)}`;
