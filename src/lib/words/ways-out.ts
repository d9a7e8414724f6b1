/** A way out in words: what to change, what that gives up, and how the plan then stands. */
import type { Change, FindingCode, LimitName, WayOut } from '$lib/engine/budget/budget';
import type { DriverSheet } from '$lib/engine/chain';
import { significant } from './format-number';
import { limitName, listed } from './limit-names';
import { marginSize, marginText } from './margin-text';
import { dbText, levelText, ohmText, qText, wattsText } from './quantities';
import { wiringOf } from './wiring-text';

type Facts = WayOut['facts'];
type Act = (facts: Facts, changes: readonly Change[], sheet: DriverSheet) => string;

/** Four digits, so that what is said is what is offered. */
const hertz = (f: number): string => `${significant(f, 4)} Hz`;
const litres = (m3: number): string => `${significant(m3 * 1000, 4)} L`;
const orNull = (value: number | null, text: (value: number) => string): string | null =>
  value === null ? null : text(value);
/** " instead of 57 L", where there was something before. */
const insteadOf = (before: string | null): string => (before === null ? '' : ` instead of ${before}`);

const givesUpAtBottom = ({ givesUp }: Facts): string =>
  givesUp === undefined || givesUp < 0.05
    ? ''
    : `, which gives up ${dbText(givesUp)} at the bottom of the band`;

const ORDINALS = ['', 'first', 'second', 'third', 'fourth', 'fifth', 'sixth', 'seventh', 'eighth'];
const ordinal = (order: number | undefined): string =>
  order === undefined ? '' : `${ORDINALS[order]}-order `;

const drivers = ({ count, value, before, wiring, nominal }: Facts): string => {
  const wired = wiring === undefined ? '' : `, wired in ${wiring}`;
  const load = nominal === undefined ? '' : ` (${ohmText(nominal)})`;
  return `Fit ${count ?? value} drivers${insteadOf(orNull(before, String))}${wired}${load}`;
};

/** " (61.2 L inside)", where the file gives the inner volume. */
function inside(changes: readonly Change[]): string {
  const change = changes.find((c) => c.set === 'inner-volume');
  return change?.set === 'inner-volume' ? ` (${litres(change.value)} inside)` : '';
}

const ACTS: { readonly [K in WayOut['kind']]: Act } = {
  level: ({ value, before }) =>
    before === null
      ? `Listen at ${levelText(value)}`
      : `Listen ${dbText(before - value)} lower, at ${levelText(value)}`,
  'high-pass': (facts) =>
    (facts.before === null
      ? `Add a ${ordinal(facts.order)}high-pass at ${hertz(facts.value)}`
      : `Move the high-pass from ${hertz(facts.before)} to ${hertz(facts.value)}`) + givesUpAtBottom(facts),
  transform: (facts) =>
    `Set the Linkwitz transform to ${hertz(facts.value)}${insteadOf(orNull(facts.before, hertz))}${givesUpAtBottom(facts)}`,
  shelf: (facts) =>
    `Set the low shelf to ${dbText(facts.value)}${insteadOf(orNull(facts.before, dbText))}${givesUpAtBottom(facts)}`,
  drivers: (facts) => `${drivers(facts)}, in the same box`,
  'drivers-and-box': (facts, changes) =>
    `${drivers(facts)}, and make the box ${litres(facts.value)} net${inside(changes)}`,
  amplifier: ({ ratings = [] }) =>
    `Fit an amplifier of ${listed(ratings.map((r) => `${wattsText(r.power)} into ${ohmText(r.load)}`))}`,
  volume: (facts, changes) =>
    `Make the box ${litres(facts.value)} net${insteadOf(orNull(facts.before, litres))}${inside(changes)}`,
  wiring: ({ coilWiring, wiring, nominal, value }, _, sheet) => {
    const wired = wiringOf({
      ...sheet,
      coilWiring: coilWiring ?? sheet.coilWiring,
      driverWiring: wiring ?? sheet.driverWiring
    });
    return `Wire ${wired}, which makes ${ohmText(nominal ?? value)}`;
  },
  cable: ({ value, before }) =>
    `Bring the cable down ${before === null ? '' : `from ${ohmText(before)} `}to ${ohmText(value)}, thicker or shorter`,
  band: (_, changes) => {
    const from = changes.find((c) => c.set === 'goal-from');
    const to = changes.find((c) => c.set === 'goal-to');
    return `Want the level only ${[
      ...(from?.set === 'goal-from' ? [`from ${hertz(from.value)} up`] : []),
      ...(to?.set === 'goal-to' ? [`up to ${hertz(to.value)}`] : [])
    ].join(' and ')}`;
  }
};

/** The way out as two sentences. `code` is the finding it is offered for, `sheet` the driver of its plan. */
export function wayOutText(way: WayOut, code: FindingCode, sheet: DriverSheet): string {
  const qtc = way.facts.qtc === undefined ? '' : `; Qtc is then ${qText(way.facts.qtc)}`;
  return `${wayOutAct(way, sheet)}${qtc}. ${wayOutOutcome(way, code)}`;
}

/** What to do, without a full stop: "Listen 1.8 dB lower, at 103.2 dB". */
export const wayOutAct = ({ kind, facts, changes }: WayOut, sheet: DriverSheet): string =>
  ACTS[kind](facts, changes, sheet);

/** Whether the way out is meant to make the plan hold; else it cures something apart from the verdict. */
const aboutLimits = (code: FindingCode): boolean =>
  code.startsWith('limit-') || code === 'boost-short' || code === 'load-low';

/** How the plan then stands: "Then it holds, with 0.2 dB in hand." */
export function wayOutOutcome({ remaining, marginAfter }: WayOut, code: FindingCode): string {
  if (remaining.length === 0) return `Then it holds, with ${marginText(marginAfter)}.`;
  const opening = aboutLimits(code) ? 'Not enough by itself' : 'Still in the way then';
  return `${opening}: ${listed(remaining.map(still))}.`;
}

function still({ code, by }: WayOut['remaining'][number]): string {
  const what = code.startsWith('limit-')
    ? limitName(code.slice('limit-'.length) as LimitName)
    : standsAs(code);
  return by === null ? what : `${what} (${marginSize(by)} dB over)`;
}

const standsAs = (code: FindingCode): string =>
  code === 'load-low' ? "a load below the amplifier's minimum" : code.replaceAll('-', ' ');
