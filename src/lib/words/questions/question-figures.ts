/** The figures behind a question's plots: columns and cells as they are read. */
import type { LimitName } from '$lib/engine/budget/budget';
import type { Sweep, SweepRow } from '$lib/engine/budget/sweep-types';
import { figures, fixed } from '../format-number';
import { limitName, shortLimitName } from '../limit-names';
import { sweptValue } from '../sweep-answer';
import { shownUnit } from '../units/quantity';
import type { System } from '../units/unit';
import { ALL_LIMITS } from './spans';

export interface FigureColumn {
  readonly name: string;
  readonly unit?: string;
  readonly text?: boolean;
}

export interface FigureTable {
  readonly caption: string;
  readonly columns: readonly FigureColumn[];
  readonly rows: readonly (readonly string[])[];
}

interface Column extends FigureColumn {
  readonly of: (row: SweepRow) => string;
}

const orDash = (value: number | null, text: (value: number) => string): string =>
  value === null || !Number.isFinite(value) ? '–' : text(value);
const three = (value: number | null): string => orDash(value, (v) => figures(v, 3));
const tenths = (value: number | null): string => orDash(value, (v) => fixed(v, 1));

const QTC: Column = { name: 'Qtc', of: (r) => fixed(r.qtc, 2) };
const F3_BOX: Column = { name: '−3 dB, box alone', unit: 'Hz', of: (r) => three(r.alignmentF3) };
const F3_ROOM: Column = { name: '−3 dB, in the room', unit: 'Hz', of: (r) => three(r.systemF3) };
const BOOST: Column = { name: 'Boost', unit: 'dB', of: (r) => tenths(r.shapingBoost) };
const WATTS: Column = { name: 'Amplifier to buy', unit: 'W', of: (r) => three(r.ratedW) };
/** RMS, as limits are counted. */
const VOLTS: Column = { name: 'Volts', unit: 'V RMS', of: (r) => three(r.peakV / Math.SQRT2) };
const LIMIT: Column = { name: 'Tightest limit', text: true, of: (r) => limitName(r.limit) };
const IN_HAND: Column = { name: 'In hand', unit: 'dB', of: (r) => tenths(r.margins[r.limit]) };
const WORST: Column = { name: 'At', unit: 'Hz', of: (r) => three(r.worst) };

function travel(system: System): Column {
  const { symbol, fromStored } = shownUnit('length-small', system);
  return { name: 'Cone travel', unit: symbol, of: (r) => three(fromStored(r.travel * 1000)) };
}

const margin = (name: LimitName): Column => ({
  name: `In hand, ${shortLimitName(name)}`,
  unit: 'dB',
  of: (r) => tenths(r.margins[name])
});

function shown(sweep: Sweep, system: System): Column {
  switch (sweep.column) {
    case 'net_L': {
      const { symbol, fromStored } = shownUnit('volume', system);
      const of = (r: SweepRow) => three(fromStored(sweptValue(sweep, r.value)));
      return { name: 'Net volume', unit: symbol, of };
    }
    case 'boost_to_Hz':
      return { name: 'Boost down to', unit: 'Hz', of: (r) => tenths(r.value) };
    case 'boost_gain_dB':
      return { name: 'Shelf gain', unit: 'dB', of: (r) => tenths(r.value) };
    case 'level_dB':
      return { name: 'Level at the seat', unit: 'dB', of: (r) => fixed(r.value, 2) };
  }
}

function measured({ over, rows }: Sweep, system: System): Column[] {
  if (over === 'volume') return [QTC, F3_BOX, F3_ROOM, BOOST, WATTS, travel(system), IN_HAND, LIMIT, WORST];
  if (over === 'boost') return [BOOST, F3_ROOM, WATTS, VOLTS, travel(system), IN_HAND, LIMIT, WORST];
  const judged = ALL_LIMITS.filter((name) => rows[0].margins[name] !== null);
  return [...judged.map(margin), LIMIT, WORST];
}

const CAPTIONS: { readonly [O in Sweep['over']]: string } = {
  volume: 'The plan in boxes of other sizes',
  boost: 'The plan with more or less boost',
  level: 'The plan at other levels'
};

export function questionFigures(sweep: Sweep, system: System): FigureTable {
  const columns = [shown(sweep, system), ...measured(sweep, system)];
  return {
    caption: CAPTIONS[sweep.over],
    columns: columns.map(({ name, unit, text }) => ({ name, unit, text })),
    rows: sweep.rows.map((row) => columns.map(({ of }) => of(row)))
  };
}
