import { textWidth } from './text-width';

/** Heights of the row under the panels, in px: with a cursor's tag, and with a handle to drag. */
export const TAG_ROW = 28;
export const HANDLE_ROW = 62;

/** The grip's upper edge, under the frame, and its height. */
const GRIP_TOP = 32;
const GRIP_HEIGHT = 28;
export const GRIP_MIDDLE = GRIP_TOP + GRIP_HEIGHT / 2;
/** Half the width and the height of the point that shows up at the cursor's line. */
const POINT = 7;
/** From the grip's edge to the far side of a chevron's reach: a press there is one step. */
const CHEVRON_REACH = 34;

export interface TagShape {
  /** Middle of the text: the cursor's place, kept within the drawing. */
  readonly middle: number;
  readonly width: number;
}

/** The box with the value: as wide as its text, moved inwards at both ends. */
export function tagShape(text: string, cursor: number, drawing: number, handle: boolean): TagShape {
  const width = textWidth(text) + (handle ? 24 : 16);
  return { middle: Math.min(drawing - width / 2, Math.max(width / 2, cursor)), width };
}

/** The grip: a box that points up at the cursor's line. */
export function gripPath({ middle, width }: TagShape, cursor: number): string {
  const left = middle - width / 2;
  const right = middle + width / 2;
  const foot = (px: number) => px2(Math.min(right, Math.max(left, px)));
  const point = `L${foot(cursor - POINT)},${GRIP_TOP}L${px2(cursor)},${GRIP_TOP - 8}L${foot(cursor + POINT)},${GRIP_TOP}`;
  return `M${px2(left)},${GRIP_TOP}${point}H${px2(right)}v${GRIP_HEIGHT}H${px2(left)}Z`;
}

/** Chevrons either side, where there is room for them. */
export function chevronPaths({ middle, width }: TagShape, drawing: number): string[] {
  const y = GRIP_MIDDLE - 6;
  const left = middle - width / 2 - 14;
  const right = middle + width / 2 + 14;
  return [
    ...(left >= 8 ? [`M${px2(left)},${y}l-6,6l6,6`] : []),
    ...(right <= drawing - 8 ? [`M${px2(right)},${y}l6,6l-6,6`] : [])
  ];
}

/** What a press at `x`, `y` of the handle's row meets. */
export function handlePart(
  { middle, width }: TagShape,
  x: number,
  y: number
): 'grip' | 'less' | 'more' | null {
  if (y < GRIP_TOP - 8) return null;
  const off = Math.abs(x - middle) - width / 2;
  if (off <= 0) return 'grip';
  if (off > CHEVRON_REACH) return null;
  return x < middle ? 'less' : 'more';
}

const px2 = (px: number): number => Math.round(px * 100) / 100;
