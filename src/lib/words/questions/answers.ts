/** The sentences over each question: what the plan asks, what is enough, what no value cures. */
import type { Sweep } from '$lib/engine/budget/sweep-types';
import { LIMIT_UNITS } from '../limit-names';
import { limitNeed } from '../limit-need';
import { aboutHertzText, dbText, qText } from '../quantities';
import type { Report } from '../report';
import type { System } from '../units/unit';
import { amplifierNeed } from './amplifier-need';
import { over, say, sentences, type Phrase } from './phrases';
import { reach } from './reach';
import { reportedLimits } from './report-limits';
import { sweptText } from './swept-text';

export interface Question {
  readonly report: Report;
  /** Null until it has been worked out. */
  readonly sweep: Sweep | null;
  readonly system: System;
}

/** What is boosted: a transform's target, a shelf's gain, or nothing yet. In the file's unit. */
export type Boost =
  { readonly kind: 'transform' | 'shelf'; readonly value: number } | { readonly kind: 'none' };

/** "961 W into 4 ohm; the amplifier gives 500 W." */
function asks(report: Report): Phrase[] {
  const { needs, has, into, short } = amplifierNeed(report);
  const need = `${needs}${into}`;
  return [short ? over(need) : say(need), say(`; the amplifier gives ${has}.`)];
}

/** What stands in the way besides limits, such as a load below the amplifier's minimum. */
export function besidesLimits({ findings }: Report): Phrase[] {
  const blocking = findings.filter(
    ({ code, severity }) => severity === 'blocking' && !code.startsWith('limit-')
  );
  return sentences(...blocking.map(({ text }) => [over(text)]));
}

const reached = ({ sweep, system }: Question): Phrase[] => (sweep === null ? [] : reach(sweep, system));

/** "At 85 L net the box has Qtc 0.82 and the plan asks for 961 W into 4 ohm; the amplifier gives 500 W. …" */
export function boxAnswer(question: Question): Phrase[] {
  const { report, system } = question;
  const { net_L: net, qtc } = report.alignment;
  const box = `At ${sweptText('net_L', net ?? NaN, system)} net the box has Qtc ${qText(qtc ?? NaN)}`;
  return sentences(
    [say(`${box}, and the plan asks for `), ...asks(report)],
    reached(question),
    besidesLimits(report)
  );
}

export function amplifierAnswer(question: Question, boost: Boost): Phrase[] {
  const { report, system } = question;
  return sentences(
    [say(`${boosted(report, boost, system)} asks for `), ...asks(report)],
    boost.kind === 'none' ? [say('Moving the handle adds a transform to Q 0.707.')] : [],
    reached(question),
    moreWatts(report),
    besidesLimits(report)
  );
}

function boosted(
  { system: { shaping_boost_dB: lift, shaping_boost_Hz: at } }: Report,
  boost: Boost,
  system: System
) {
  if (boost.kind === 'none') return 'The plan has no boost yet and';
  const what =
    boost.kind === 'transform'
      ? `Boost down to ${sweptText('boost_to_Hz', boost.value, system)}`
      : `A low shelf of ${sweptText('boost_gain_dB', boost.value, system)}`;
  const lifts =
    lift === null || at === null || lift < 0.05 ? '' : ` lifts ${aboutHertzText(at)} by ${dbText(lift)} and`;
  return `${what}${lifts}`;
}

/** Said where a limit that no amplifier mends is over now. */
function moreWatts(report: Report): Phrase[] {
  const others = reportedLimits(report).filter(({ limit }) => !limit.startsWith('amplifier-'));
  const worst = others.reduce((a, b) => (b.margin < a.margin ? b : a), others[0]);
  if (worst === undefined || worst.margin >= 0) return [];
  const { factor } = LIMIT_UNITS[worst.limit];
  const need = limitNeed(worst.limit, worst.demanded / factor, worst.allowed / factor);
  return [over('More watts alone will not help:'), say(` at ${aboutHertzText(worst.worstHz)} ${need}.`)];
}
