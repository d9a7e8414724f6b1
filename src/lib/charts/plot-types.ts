/** What a plot is told to draw. Data are in the owner's units; the charts know scales and strokes, no plan. */

/** Numbers in order; NaN is a gap. */
export type Series = Float64Array | readonly number[];

export type Limit = 'volts' | 'amps' | 'travel' | 'stop' | 'heat';
/** What a line stands for. Limits carry three signs: colour, dash and the written name that the owner gives. */
export type Tone = Limit | 'played' | 'wanted' | 'ghost' | 'plain';

export type ScaleKind = 'linear' | 'log';
export type Domain = readonly [low: number, high: number];

export interface XAxis {
  readonly kind: ScaleKind;
  readonly domain: Domain;
  /** Written at the left end of the axis: "Hz". */
  readonly unit?: string;
  /** Values to mark, or a function of how many labels have room. */
  readonly ticks?: readonly number[] | ((room: number) => readonly number[]);
  /** Values with a grid line; the ticks, if not given. */
  readonly grid?: readonly number[];
  readonly format?: (value: number) => string;
}

export interface YAxis {
  readonly kind: ScaleKind;
  readonly domain: Domain;
  readonly ticks?: readonly number[];
  /** The value whose grid line is drawn stronger. */
  readonly strong?: number;
  readonly format?: (value: number) => string;
}

/** A second scale on the right, marked at values of the first: 500 W beside 44.7 V. */
export interface SecondAxis {
  readonly ticks: readonly { readonly at: number; readonly text: string }[];
}

interface Named {
  readonly id: string;
  readonly label?: string;
  /** Where space is short; the label, if not given. */
  readonly shortLabel?: string;
}

/** Where a label would rather stand: near this x, on this side of its line. */
interface Placed {
  readonly near?: number;
  readonly side?: 'above' | 'below';
}

export interface Curve extends Named, Placed {
  readonly tone: Tone;
  readonly x: Series;
  readonly y: Series;
  /** False: no dot where the cursor crosses it. */
  readonly dot?: boolean;
}

/** A level line across the whole panel: "Xmax 16 mm". */
export interface Rule extends Named, Placed {
  readonly tone: Tone;
  readonly at: number;
  readonly dot?: boolean;
}

/** Out of bounds (grey hatch), or where the plan is out of bounds (red hatch on tint). */
export type RegionTone = 'out' | 'over';
/** An edge of a region: a curve, a level, or an end of the panel. */
export type Edge = Series | number | 'top' | 'bottom';

interface RegionBase extends Named {
  readonly tone: RegionTone;
}
/** All that lies above `from` and below `to`; where they cross over, nothing. Without `x` it spans the panel. */
export interface RegionBetween extends RegionBase {
  readonly x?: Series;
  readonly from: Edge;
  readonly to: Edge;
}
/** A closed outline. */
export interface RegionOutline extends RegionBase {
  readonly outline: { readonly x: Series; readonly y: Series };
}
export type Region = RegionBetween | RegionOutline;

/** How far a curve may be wrong: the band between its least and its most. */
export interface Doubt extends Named, Placed {
  readonly x: Series;
  readonly low: Series;
  readonly high: Series;
}

/** Values of x within limits, tinted and named; `above` keeps the tint over that y. */
export interface Range extends Named {
  readonly from: number;
  readonly to: number;
  readonly above?: number;
}

/** A limit's name on a row of its own, with a hairline down to where its margin is nothing. */
export interface Flag extends Named {
  readonly label: string;
  readonly tone: Tone;
  readonly x: number;
}

/** One figure at the cursor: "travel 27.2 mm". */
export interface ReadingPart {
  readonly name?: string;
  readonly text: string;
  readonly tone?: 'normal' | 'over';
}

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}
