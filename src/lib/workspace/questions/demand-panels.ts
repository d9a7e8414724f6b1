/** Panels of what is asked of amplifier and cone over a swept value: watts, volts, travel. */
import { niceDomain, niceLogDomain } from '$lib/charts/nice-domain';
import type { Sweep, SweepRow } from '$lib/engine/budget/sweep-types';
import { significant } from '$lib/words/format-number';
import { ohmText, voltsText, wattsText } from '$lib/words/quantities';
import { shownUnit } from '$lib/words/units/quantity';
import { roundedText } from '$lib/words/units/quantity-text';
import type { System } from '$lib/words/units/unit';
import { beyond, unnamed, type PanelData, type Rule } from './panel-data';
import type { QuestionRanges } from './question-ranges';

/** What the plots need beside the sweep: figures of the plan that no sweep changes. */
export interface DemandLimits {
  /** W into the nominal load, and that load in ohm. */
  readonly ratedW: number | null;
  readonly load: number;
  /** V RMS. */
  readonly volts: number | null;
  /** m; null where the sheet does not say. */
  readonly xmax: number | null;
  readonly xmech: number | null;
}

export interface Swept {
  readonly sweep: Sweep;
  /** The swept values in the unit shown. */
  readonly x: readonly number[];
  readonly tint: QuestionRanges;
  readonly limits: DemandLimits;
  readonly system: System;
}

const column = ({ sweep }: Swept, of: (row: SweepRow) => number): number[] => sweep.rows.map(of);

/** Labels prefer these shares of the axis: the need where it is high, the rule away from it. */
const share = ({ x }: Swept, part: number): number => x[Math.round(part * (x.length - 1))];

export const wattsTitle = (load: number): string => `Amplifier to buy, W into ${ohmText(load)}`;
export const VOLTS_TITLE = 'Amplifier volts, RMS';
export const travelTitle = (system: System): string =>
  `Peak cone travel, ${shownUnit('length-small', system).symbol}`;

export function wattsPanel(of: Swept, named: boolean): PanelData {
  const { ratedW, load } = of.limits;
  const watts = column(of, (r) => r.ratedW);
  const axis = niceLogDomain(watts, {
    steps: 4,
    include: ratedW === null ? [] : [ratedW * 0.8, ratedW * 1.3]
  });
  return {
    title: wattsTitle(load),
    height: 120,
    y: { ...axis, format: (w) => significant(w, 4) },
    curves: [{ id: 'watts', tone: 'played', label: 'needed', near: share(of, 0.3), x: of.x, y: watts }],
    rules: ruleAt('rated', 'volts', ratedW, (w) => `rated ${wattsText(w)}`, share(of, 0.15)),
    regions: ratedW === null ? [] : beyond(of.x, ratedW, watts),
    ranges: named ? of.tint.ranges : unnamed(of.tint.ranges)
  };
}

export function voltsPanel(of: Swept): PanelData {
  const { volts: most } = of.limits;
  const volts = column(of, (r) => r.peakV / Math.SQRT2);
  return {
    title: VOLTS_TITLE,
    height: 104,
    y: niceDomain(volts, { steps: 4, include: [0, ...(most === null ? [] : [most * 1.15])] }),
    curves: [{ id: 'volts', tone: 'played', label: 'needed', near: share(of, 0.3), x: of.x, y: volts }],
    rules: ruleAt('most', 'volts', most, (v) => `amplifier's ${voltsText(v)}`, share(of, 0.15)),
    regions: most === null ? [] : beyond(of.x, most, volts),
    ranges: unnamed(of.tint.ranges)
  };
}

export function travelPanel(of: Swept): PanelData {
  const { xmax, xmech } = of.limits;
  const { fromStored } = shownUnit('length-small', of.system);
  const shown = (m: number) => fromStored(m * 1000);
  const text = (m: number) => roundedText(m * 1000, 'length-small', of.system);
  const metres = column(of, (r) => r.travel);
  const travel = metres.map(shown);
  // The stop is drawn where the travel comes near it; far above it would flatten the curve.
  const most = Math.max(...metres, xmax ?? 0);
  const stop = xmech !== null && xmech < 2 * most ? xmech : null;
  const include = [0, ...[xmax, stop].flatMap((m) => (m === null ? [] : [shown(m) * 1.1]))];
  return {
    title: travelTitle(of.system),
    height: 112,
    y: niceDomain(travel, { steps: 4, include }),
    curves: [{ id: 'travel', tone: 'played', label: 'needed', near: share(of, 0.3), x: of.x, y: travel }],
    rules: [
      ...ruleAt('xmax', 'travel', xmax, (m) => `Xmax ${text(m)}`, share(of, 0.15), shown),
      ...ruleAt('stop', 'stop', stop, (m) => `cone stop ${text(m)}`, share(of, 0.7), shown)
    ],
    regions: xmax === null ? [] : beyond(of.x, shown(xmax), travel),
    // Where only the amplifier is enough the cone is not.
    ranges: of.tint.all ? unnamed(of.tint.ranges) : []
  };
}

function ruleAt(
  id: string,
  tone: Rule['tone'],
  value: number | null,
  label: (value: number) => string,
  near: number,
  shown = (v: number) => v
): Rule[] {
  return value === null ? [] : [{ id, tone, at: shown(value), label: label(value), near, dot: false }];
}
