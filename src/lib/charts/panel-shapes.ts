/** The data of a panel as lines and areas on the screen: worked out when data or scales change, never for the cursor. */
import { between, type Between } from './between';
import { bandPath, levelPixels, outlinePath, toPixels, type Pixels, type Screen } from './path';
import type { Curve, Doubt, Edge, Region, Rule, Series } from './plot-types';
import { straighten, straightenPair } from './straighten';

export interface Trace {
  readonly of: Curve | Rule;
  readonly pixels: Pixels;
}

export interface RegionShape {
  readonly of: Region;
  readonly path: string;
  /** What its note may stand in. */
  readonly room: Between | Pixels;
}

export interface DoubtShape {
  readonly of: Doubt;
  readonly low: Pixels;
  readonly high: Pixels;
}

export const curveTrace = (of: Curve, screen: Screen): Trace => ({
  of,
  pixels: straighten(toPixels(of.x, of.y, screen))
});

export const ruleTrace = (of: Rule, screen: Screen): Trace => ({ of, pixels: levelPixels(of.at, screen) });

export function doubtShape(of: Doubt, screen: Screen): DoubtShape {
  const [low, high] = straightenPair(toPixels(of.x, of.low, screen), toPixels(of.x, of.high, screen));
  return { of, low, high };
}

export function regionShape(of: Region, screen: Screen): RegionShape {
  if ('outline' in of) {
    const room = toPixels(of.outline.x, of.outline.y, screen);
    return { of, path: outlinePath(room), room };
  }
  const room = between(edgePixels(of.from, of.x, screen), edgePixels(of.to, of.x, screen));
  const [low, high] = straightenPair(room.from, room.to);
  return { of, path: bandPath(low, high), room: { from: low, to: high } };
}

function edgePixels(edge: Edge, x: Series | undefined, screen: Screen): Pixels {
  if (typeof edge === 'object') return toPixels(requireX(x), edge, screen);
  const at = edge === 'top' ? screen.top : edge === 'bottom' ? screen.bottom : screen.y(edge);
  if (!x)
    return { x: Float64Array.of(screen.left, screen.right), y: Float64Array.of(at, at), ascending: true };
  const line = toPixels(x, x, screen);
  return { ...line, y: line.y.map(() => at) };
}

function requireX(x: Series | undefined): Series {
  if (!x) throw new Error('a region along a curve needs the x of its points');
  return x;
}
