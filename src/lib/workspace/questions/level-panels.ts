/** Panels of the level question: what is in hand of each limit, and where in frequency each level gives out. */
import { logTicks } from '$lib/charts/log-ticks';
import type { Curve, Doubt, Flag, Rule } from '$lib/charts/plot-types';
import type { Curves, LimitName } from '$lib/engine/budget/budget';
import { limitName, shortLimitName } from '$lib/words/limit-names';
import { safeLevelText } from '$lib/words/quantities';
import type { ReportedLimit } from '$lib/words/questions/report-limits';
import { ALL_LIMITS } from '$lib/words/questions/spans';
import { blank, LIMIT_TONES, type PanelData } from './panel-data';

const HAND_TITLE = 'In hand before each limit, dB';
const PLACE_TITLE = 'Where it gives out first, Hz';
const HAND_HEIGHT = 240;
const PLACE_HEIGHT = 150;

/** A limit and the level at which it gives out, dB at the seat. */
export interface Crossing {
  readonly limit: LimitName;
  readonly level: number;
}

export const crossings = (limits: readonly ReportedLimit[], level: number): Crossing[] =>
  limits.map(({ limit, margin }) => ({ limit, level: level + margin }));

export interface LevelPicture {
  /** The levels drawn, dB. */
  readonly from: number;
  readonly to: number;
  readonly crossings: readonly Crossing[];
  /** Where the room's doubt puts the highest level, dB; null without doubt. */
  readonly doubt: { readonly least: number; readonly most: number; readonly label: string } | null;
}

/** Every limit falls dB for dB with the level. */
export function handPanel({ from, to, crossings: all, doubt }: LevelPicture): PanelData {
  const first = Math.min(...all.map(({ level }) => level));
  const curves = all.map(({ limit, level }): Curve => {
    const names = { label: limitName(limit), shortLabel: shortLimitName(limit) };
    return { id: limit, tone: LIMIT_TONES[limit], ...names, x: [from, to], y: [level - from, level - to] };
  });
  const flags = all.map(({ limit, level }): Flag => ({
    id: limit,
    tone: LIMIT_TONES[limit],
    x: level,
    label: `${limitName(limit)} ${safeLevelText(level)}`,
    shortLabel: `${shortLimitName(limit)} ${safeLevelText(level).replace(' dB', '')}`
  }));
  const zero: Rule = { id: 'zero', tone: 'plain', at: 0, dot: false };
  const doubts: Doubt[] =
    doubt === null
      ? []
      : [
          {
            id: 'room',
            label: doubt.label,
            shortLabel: 'room',
            near: from + (first - from) / 3,
            x: [from, to],
            low: [doubt.least - from, doubt.least - to],
            high: [doubt.most - from, doubt.most - to]
          }
        ];
  return {
    title: HAND_TITLE,
    height: HAND_HEIGHT,
    y: handAxis(first - to),
    curves,
    flags,
    doubts,
    rules: [zero],
    regions: [{ id: 'out', tone: 'out', from: 'bottom', to: 0, label: 'out of bounds' }],
    ranges:
      first <= from
        ? []
        : [
            {
              id: 'within',
              from,
              to: Math.min(first, to),
              above: 0,
              label: `within limits up to ${safeLevelText(first)}`,
              shortLabel: 'within limits'
            }
          ]
  };
}

/** Zero is in the picture in any case, with the lines about it; `last` is the least in hand at the right end, dB. */
function handAxis(last: number): PanelData['y'] {
  const whole = (db: number) => 4 * Math.round(db / 4);
  const low = Math.min(-8, whole(last + 10));
  const high = Math.max(14, whole(last + 20));
  const ticks = Array.from({ length: Math.floor((high - low) / 4) + 1 }, (_, i) => low + 4 * i);
  return { kind: 'linear', domain: [low, high], ticks, strong: 0 };
}

/** The level at which each frequency gives out, and by which limit; below the programme's lowest note nothing is asked. */
export function placePanel(
  { f, delivered, ceilings }: Curves,
  { level, lowest, from, to }: { level: number; lowest: number; from: number; to: number }
): PanelData {
  const asked = [...f.keys()].filter((i) => f[i] >= lowest);
  const points = asked.map((i) => {
    let limit: LimitName = 'amplifier-voltage';
    let least = Infinity;
    for (const name of ALL_LIMITS) {
      const inHand = (ceilings[name]?.[i] ?? Infinity) - delivered[i];
      if (inHand < least) [limit, least] = [name, inHand];
    }
    return { hz: f[i], limit, at: level + least };
  });
  const ends = [f[asked[0]], f[f.length - 1]] as const;
  const most = Math.min(...points.map(({ at }) => at));
  return {
    title: PLACE_TITLE,
    height: PLACE_HEIGHT,
    y: { kind: 'log', domain: ends, ticks: logTicks(ends[0], ends[1], 5) },
    curves: stretches(points),
    regions: [
      {
        id: 'out',
        tone: 'out',
        outline: {
          x: [to + 1, ...points.map(({ at }) => at), to + 1],
          y: [ends[0], ...points.map(({ hz }) => hz), ends[1]]
        },
        label: 'out of bounds'
      }
    ],
    ranges: [{ id: 'within', from, to: most, label: 'every limit kept' }]
  };
}

/** One line a limit; each reaches to the point where the next begins. */
function stretches(points: readonly { hz: number; limit: LimitName; at: number }[]): Curve[] {
  const curves: Curve[] = [];
  const named = new Set<LimitName>();
  for (let start = 0; start < points.length;) {
    const { limit } = points[start];
    let end = start;
    while (end < points.length && points[end].limit === limit) end++;
    const part = points.slice(start, Math.min(end + 1, points.length));
    const names = named.has(limit) ? {} : { label: limitName(limit), shortLabel: shortLimitName(limit) };
    named.add(limit);
    curves.push({
      id: `${limit} ${start}`,
      tone: LIMIT_TONES[limit],
      ...names,
      x: part.map(({ at }) => at),
      y: part.map(({ hz }) => hz)
    });
    start = end;
  }
  return curves;
}

export const blankLevelPanels = (): PanelData[] =>
  [
    { title: HAND_TITLE, height: HAND_HEIGHT },
    { title: PLACE_TITLE, height: PLACE_HEIGHT }
  ].map(blank);
