/** Stacks of the workspace's kinds, on invented data: for snapshots and for tests of behaviour. */
import { logTicks, thirdOctaves, thirdOctaveTicks } from '$lib/charts/log-ticks';
import type { XAxis } from '$lib/charts/plot-types';
import {
  levelCurves,
  marginCurves,
  marginFlags,
  RATED_V,
  RUNS_OUT,
  runsOut,
  specimenData,
  volumeSweep,
  XMAX
} from './specimen-data';
import type { Specimen, StackProps } from './stack-of';

type Moves = Pick<StackProps, 'onmove' | 'onstep' | 'onstart' | 'onend'>;

export const FREQUENCY: XAxis = {
  kind: 'log',
  domain: [10, 200],
  unit: 'Hz',
  ticks: (room) => thirdOctaveTicks(10, 200, room),
  grid: thirdOctaves(10, 200)
};

const one = (value: number) => value.toFixed(1).replace('-', '−');

/** Three panels over frequency, as in the plan view. At 105 dB the travel is over, at 94 dB it is not. */
export function levelSpecimen({
  level = 105,
  value = 20,
  width = 800,
  ...moves
}: Moves & { level?: number; value?: number; width?: number } = {}): Specimen {
  const data = specimenData(level, 120);
  const at = data.f.findIndex((f) => f >= value);
  return {
    stack: {
      label: 'Cursor frequency',
      x: FREQUENCY,
      value,
      tag: (v) => `${v} Hz`,
      valueText: (v) => `${v} hertz. Played ${one(data.played[at])} decibels.`,
      snap: (v) => Math.round(v * 10) / 10,
      secondAxis: true,
      firstWidth: width,
      ...moves
    },
    panels: [
      {
        title: 'Level at the seat, dB',
        height: 290,
        y: { kind: 'linear', domain: [86, 123], ticks: [90, 95, 100, 105, 110, 115, 120], strong: level },
        curves: levelCurves(data, level),
        regions: [
          {
            id: 'out',
            tone: 'out',
            x: data.f,
            from: data.lowest,
            to: 'top',
            label: 'out of bounds above the lowest ceiling',
            shortLabel: 'out of bounds'
          },
          { id: 'over', tone: 'over', x: data.f, from: data.lowest, to: data.played }
        ],
        reading: [
          { name: 'played', text: one(data.played[at]) },
          {
            name: 'travel',
            text: one(data.ceilings.travel[at]),
            tone: data.played[at] > data.ceilings.travel[at] ? 'over' : 'normal'
          }
        ]
      },
      {
        title: 'Cone travel, mm peak',
        height: 104,
        y: { kind: 'linear', domain: [0, 32], ticks: [0, 8, 16, 24, 32] },
        curves: [
          { id: 'travel', tone: 'played', label: 'travel needed', near: 65, x: data.f, y: data.travel }
        ],
        rules: [
          { id: 'xmax', tone: 'travel', at: XMAX, label: `Xmax ${XMAX} mm`, near: 110 },
          { id: 'stop', tone: 'stop', at: 26, label: 'cone stop 26 mm', shortLabel: 'cone stop', near: 50 }
        ],
        regions: [
          { id: 'out', tone: 'out', from: XMAX, to: 'top' },
          { id: 'over', tone: 'over', x: data.f, from: XMAX, to: data.travel }
        ]
      },
      {
        title: 'Amplifier demand, V RMS and W into 4 Ω',
        height: 104,
        y: { kind: 'linear', domain: [0, 80], ticks: [0, 20, 40, 60, 80] },
        second: { ticks: [100, 250, 500, 1000, 1500].map((w) => ({ at: Math.sqrt(w * 4), text: `${w}` })) },
        curves: [{ id: 'volts', tone: 'played', label: 'volts needed', near: 65, x: data.f, y: data.volts }],
        rules: [{ id: 'rated', tone: 'volts', at: RATED_V, label: 'rated 500 W', near: 110 }]
      }
    ]
  };
}

/** The same level panel alone, with the room's doubt and the curve from before a change. */
export function doubtSpecimen(width = 800): Specimen {
  const { stack, panels } = levelSpecimen({ level: 96, width });
  const data = specimenData(96, 120);
  const before = specimenData(90, 120);
  const shifted = (db: number) => data.played.map((v) => v + db);
  return {
    stack,
    panels: [
      {
        ...panels[0],
        curves: [
          { id: 'before', tone: 'ghost', label: 'before', x: before.f, y: before.played },
          ...(panels[0].curves ?? [])
        ],
        doubts: [
          {
            id: 'room',
            label: 'room, 4 dB either way',
            near: 60,
            x: data.f,
            low: shifted(-4),
            high: shifted(4)
          }
        ]
      }
    ]
  };
}

/** A sweep with a handle, on a log axis of litres. */
export function volumeSpecimen({
  value = 85,
  width = 800,
  ...moves
}: Moves & { value?: number; width?: number } = {}): Specimen {
  const { litres, qtc, watts, travel } = volumeSweep();
  const enough = { id: 'enough', from: 185, to: 250 };
  return {
    stack: {
      label: 'Net box volume, litres',
      x: { kind: 'log', domain: [30, 250], unit: 'L', ticks: (room) => logTicks(30, 250, room) },
      value,
      tag: (v) => `${v} L net`,
      valueText: (v) => `${v} litres net`,
      snap: Math.round,
      handle: true,
      firstWidth: width,
      ...moves
    },
    panels: [
      {
        title: 'Qtc before shaping',
        height: 84,
        y: { kind: 'linear', domain: [0.5, 1.3], ticks: [0.5, 0.71, 1, 1.25] },
        curves: [{ id: 'qtc', tone: 'played', x: litres, y: qtc }],
        ranges: [{ ...enough, label: 'amplifier is enough from 185 L', shortLabel: 'enough from 185 L' }],
        reading: [{ text: '0.82' }]
      },
      {
        title: 'Watts needed into 4 Ω',
        height: 120,
        y: { kind: 'log', domain: [200, 3000], ticks: [250, 500, 1000, 2000] },
        curves: [{ id: 'watts', tone: 'played', label: 'needed', near: 50, x: litres, y: watts }],
        rules: [{ id: 'rated', tone: 'volts', at: 611, label: 'rated 611 W', near: 38, side: 'below' }],
        regions: [
          { id: 'out', tone: 'out', from: 611, to: 'top' },
          { id: 'over', tone: 'over', x: litres, from: 611, to: watts }
        ],
        ranges: [enough],
        reading: [{ text: '942 W', tone: 'over' }]
      },
      {
        title: 'Peak cone travel, mm',
        height: 100,
        y: { kind: 'linear', domain: [0, 40] },
        curves: [
          {
            id: 'travel',
            tone: 'played',
            label: 'needed, whatever the volume',
            shortLabel: 'needed',
            near: 45,
            x: litres,
            y: travel
          }
        ],
        rules: [{ id: 'xmax', tone: 'travel', at: XMAX, label: 'Xmax 16 mm', near: 38, side: 'below' }],
        regions: [
          { id: 'out', tone: 'out', from: XMAX, to: 'top' },
          { id: 'over', tone: 'over', x: litres, from: XMAX, to: travel }
        ]
      }
    ]
  };
}

/** Margins against the level wanted, with flags; below it a curve that turns back on itself. */
export function loudnessSpecimen({ value = 105, width = 800, low = 88, high = 114 } = {}): Specimen {
  const edge = runsOut();
  return {
    stack: {
      label: 'Level at the seat, decibels',
      x: { kind: 'linear', domain: [low, high], unit: 'dB' },
      value,
      tag: (v) => `${v} dB wanted`,
      handle: true,
      firstWidth: width
    },
    panels: [
      {
        title: 'In hand before each limit, dB',
        height: 240,
        y: { kind: 'linear', domain: [-8, 14], ticks: [-8, -4, 0, 4, 8, 12] },
        curves: marginCurves(low, high),
        rules: [{ id: 'zero', tone: 'plain', at: 0, dot: false }],
        regions: [{ id: 'out', tone: 'out', from: 'bottom', to: 0, label: 'out of bounds' }],
        ranges: [
          {
            id: 'within',
            from: low,
            to: 100.2,
            above: 0,
            label: 'within limits up to 100.2 dB',
            shortLabel: 'within limits'
          }
        ],
        flags: marginFlags,
        reading: RUNS_OUT.map(({ short, at }) => ({
          name: short,
          text: one(at - value),
          tone: at < value ? 'over' : 'normal'
        }))
      },
      {
        title: 'Where it runs out: frequency, Hz',
        height: 170,
        y: { kind: 'log', domain: [10, 100], ticks: [10, 16, 25, 40, 63, 100] },
        curves: [{ id: 'edge', tone: 'travel', label: 'cone travel', near: 104, x: edge.level, y: edge.f }],
        regions: [
          {
            id: 'out',
            tone: 'out',
            outline: { x: [high + 1, ...edge.level, high + 1], y: [10, ...edge.f, 100] },
            label: 'out of bounds'
          }
        ],
        ranges: [{ id: 'within', from: low, to: 100.2, label: 'all limits respected' }]
      }
    ]
  };
}
