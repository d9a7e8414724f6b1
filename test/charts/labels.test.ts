import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { FLAG_GAP, flagRows } from '$lib/charts/flag-rows';
import { lineSpots, outlineSpots, rangeSpots, regionSpots, type Spots } from '$lib/charts/label-spots';
import { occupancy } from '$lib/charts/occupancy';
import type { Pixels } from '$lib/charts/path';
import { dodgeCursor, placeLabels, under, type LabelRequest } from '$lib/charts/place-labels';
import type { Box } from '$lib/charts/plot-types';

const PANEL: Box = { x: 40, y: 10, w: 400, h: 200 };
const SIZE = { w: 60, h: 14 };

const line = (points: readonly (readonly [number, number])[]): Pixels => ({
  x: Float64Array.from(points, ([x]) => x),
  y: Float64Array.from(points, ([, y]) => y),
  ascending: true
});
const level = (y: number) =>
  line([
    [40, y],
    [440, y]
  ]);
const within = (outer: Box, { x, y, w, h }: Box) =>
  x >= outer.x && y >= outer.y && x + w <= outer.x + outer.w && y + h <= outer.y + outer.h;
const meet = (a: Box, b: Box) => a.x < b.x + b.w && a.x + a.w > b.x && a.y < b.y + b.h && a.y + a.h > b.y;
const all = (spots: Spots) => {
  const out: { x: number; y: number; cost: number }[] = [];
  spots((x, y, cost) => out.push({ x, y, cost }));
  return out;
};
const request = (id: string, of: Pixels, near?: number, side?: 'above' | 'below'): LabelRequest => ({
  id,
  ...SIZE,
  spots: lineSpots(of, PANEL, SIZE, { near, side })
});

describe('where lines run', () => {
  test('a box with a line through it is crossed, one beside it is not', () => {
    const crossings = occupancy(PANEL, [level(100)]);
    expect(crossings(100, 95, 40, 10)).toBe(10);
    expect(crossings(100, 104, 40, 10)).toBe(0);
    expect(crossings(PANEL.x, PANEL.y, PANEL.w, PANEL.h)).toBe(100);
  });

  test('two lines count twice, and gaps and what lies outside count nothing', () => {
    const crossings = occupancy(PANEL, [level(100), level(100), level(5), level(Number.NaN)]);
    expect(crossings(PANEL.x, PANEL.y, PANEL.w, PANEL.h)).toBe(200);
  });

  test('the sum over a box is the sum over its halves', () => {
    const crossings = occupancy(PANEL, [
      line([
        [40, 10],
        [200, 180],
        [440, 60]
      ])
    ]);
    const left = crossings(40, 10, 200, 200);
    const right = crossings(240, 10, 200, 200);
    expect(left).toBeGreaterThan(0);
    expect(left + right).toBe(crossings(PANEL.x, PANEL.y, PANEL.w, PANEL.h));
  });
});

describe('labels on lines', () => {
  test('a label stands near where it would rather be, on its side, off its line', () => {
    const lines = [level(100)];
    const crossings = occupancy(PANEL, lines);
    const [above] = placeLabels([request('a', lines[0], 300)], crossings);
    const [below] = placeLabels([request('a', lines[0], 300, 'below')], crossings);
    expect(above.y + above.h).toBeLessThan(100);
    expect(below.y).toBeGreaterThan(100);
    expect(Math.abs(above.x + above.w / 2 - 300)).toBeLessThan(8);
  });

  test('it goes elsewhere rather than over another line or label', () => {
    const lines = [
      level(100),
      line([
        [240, 60],
        [360, 99]
      ])
    ];
    const crossings = occupancy(PANEL, lines);
    const taken = [{ x: 250, y: 103, w: 80, h: 14 }];
    const placed = placeLabels([request('a', lines[0], 300), request('b', lines[0], 300)], crossings, taken);
    expect(placed).toHaveLength(2);
    for (const label of placed) {
      expect(crossings(label.x, label.y, label.w, label.h)).toBe(0);
      expect(meet(label, taken[0])).toBe(false);
    }
    expect(meet(placed[0], placed[1])).toBe(false);
  });

  test('it does not stand behind another line, where it would seem to name that one', () => {
    // The upper line has another 8 px under it along its right half, so that only its left half is free below.
    const lines = [
      level(60),
      line([
        [240, 68],
        [440, 68]
      ])
    ];
    const [label] = placeLabels([request('a', lines[0], 350, 'below')], occupancy(PANEL, lines), [
      { x: 40, y: 10, w: 400, h: 48 }
    ]);
    expect(label.y).toBeLessThan(68);
    expect(label.x + label.w).toBeLessThan(242);
  });

  test('every spot is within the panel; a line outside it has none', () => {
    const steep = line([
      [40, -500],
      [240, 900],
      [440, 20]
    ]);
    const spots = all(lineSpots(steep, PANEL, SIZE));
    expect(spots.length).toBeGreaterThan(10);
    expect(spots.every((spot) => within(PANEL, { ...spot, ...SIZE }))).toBe(true);
    expect(placeLabels([request('a', level(5))], occupancy(PANEL, []))).toEqual([]);
  });

  test('under the cursor a label steps aside, the others stay, and it comes back', () => {
    const lines = [level(60), level(150)];
    const crossings = occupancy(PANEL, lines);
    const requests = [request('a', lines[0], 200), request('b', lines[1], 320)];
    const home = placeLabels(requests, crossings);
    const cursor = home[0].x + 30;
    const moved = dodgeCursor(home, requests, crossings, [], cursor);
    expect(under(home[0], cursor)).toBe(true);
    expect(under(moved[0], cursor)).toBe(false);
    expect(moved[1]).toBe(home[1]);
    expect(dodgeCursor(home, requests, crossings, [], 430)).toEqual(home);
  });
});

describe('notes', () => {
  test('a note stands in what is hatched, clear of both edges', () => {
    const room = {
      from: line([
        [40, 30],
        [200, 60],
        [440, 150]
      ]),
      to: level(10)
    };
    const spots = all(regionSpots(room, PANEL, SIZE));
    expect(spots.length).toBeGreaterThan(0);
    for (const { x, y } of spots) {
      const edge = x < 200 ? 30 + ((x - 40) / 160) * 30 : 60 + ((x - 200) / 240) * 90;
      expect(y).toBeGreaterThan(10);
      expect(y + SIZE.h).toBeLessThan(edge + 1e-9);
    }
  });

  test('where it does not fit there is none', () => {
    expect(all(regionSpots({ from: level(25), to: level(10) }, PANEL, SIZE))).toEqual([]);
  });

  test('within a closed outline all corners are inside', () => {
    const triangle = line([
      [40, 10],
      [440, 10],
      [440, 210],
      [40, 10]
    ]);
    const spots = all(outlineSpots(triangle, PANEL, SIZE));
    expect(spots.length).toBeGreaterThan(0);
    for (const { x, y } of spots) expect(y + SIZE.h - 10).toBeLessThan((x - 40) / 2);
  });

  test('a range is named inside if it is wide enough, else beside it', () => {
    const cheapest = (box: Box) => all(rangeSpots(box, PANEL, SIZE)).sort((a, b) => a.cost - b.cost)[0];
    const wide = { x: 100, y: 10, w: 200, h: 200 };
    expect(within(wide, { ...cheapest(wide), ...SIZE })).toBe(true);
    const thin = { x: 400, y: 10, w: 40, h: 200 };
    expect(cheapest(thin).x + SIZE.w).toBeLessThan(thin.x);
  });
});

describe('flags', () => {
  test('read to the right, the leftmost on top, while there is room', () => {
    const flags = [
      { id: 'b', x: 150, width: 60 },
      { id: 'a', x: 100, width: 60 }
    ];
    expect(flagRows(flags, 40, 440)).toEqual([
      { id: 'a', side: 'right', row: 0 },
      { id: 'b', side: 'right', row: 1 }
    ]);
  });

  test('turn to the left where the frame ends', () => {
    const flags = [
      { id: 'a', x: 380, width: 60 },
      { id: 'b', x: 430, width: 60 }
    ];
    expect(flagRows(flags, 40, 440)).toEqual([
      { id: 'b', side: 'left', row: 0 },
      { id: 'a', side: 'left', row: 1 }
    ]);
  });

  test('no label lies across a hairline that reads to the same side, and none leaves the frame', () => {
    const flag = fc.record({
      x: fc.integer({ min: 40, max: 440 }),
      width: fc.integer({ min: 20, max: 150 })
    });
    fc.assert(
      fc.property(fc.uniqueArray(flag, { maxLength: 6, selector: ({ x }) => x }), (list) => {
        const flags = list.map((one, i) => ({ ...one, id: String(i) }));
        const rows = flagRows(flags, 40, 440);
        expect(rows.map(({ row }) => row)).toEqual(flags.map((_, i) => i));
        const flagged = rows.map((row) => ({ ...row, ...flags[Number(row.id)] }));
        for (const a of flagged) {
          const left = a.side === 'right' ? a.x + FLAG_GAP : a.x - FLAG_GAP - a.width;
          expect(left).toBeGreaterThanOrEqual(40);
          expect(left + a.width).toBeLessThanOrEqual(440);
          for (const b of flagged) {
            // A hairline rises to its own row: rows below that of `a` end under it.
            if (b.side !== a.side || b.row >= a.row) continue;
            expect(b.x > left && b.x < left + a.width).toBe(false);
          }
        }
      })
    );
  });
});
