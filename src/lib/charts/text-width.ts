/** Sizes of plot text in px: they follow the tokens --t-sm (labels) and --t-xs (ticks). */
export const LABEL_PX = 13;
export const TICK_PX = 12;

/**
 * Advance widths of Fira Sans Medium in thousandths of the size, measured in a browser; figures are tabular.
 * An estimate: it lets labels be placed before fonts load and without a screen, the same everywhere.
 */
const CLASSES: readonly (readonly [chars: string, width: number])[] = [
  ['.,:;', 240],
  [' \u00a0', 250],
  ['ijl', 290],
  ['frtI()J', 350],
  ['-', 405],
  ['sczkvxy', 490],
  ['+−–/±°', 515],
  ['0123456789', 560],
  ['abdeghnopquELFS', 575],
  ['ABCKPRTVXYZ', 590],
  ['DGHNOQU', 670],
  ['wΩ', 740],
  ['mMW', 830]
];
const TYPICAL = 560;

const WIDTHS = new Map(CLASSES.flatMap(([chars, width]) => [...chars].map((char) => [char, width] as const)));

/** Width of a text in px. */
export function textWidth(text: string, px = LABEL_PX): number {
  let width = 0;
  for (const char of text) width += WIDTHS.get(char) ?? TYPICAL;
  return (width * px) / 1000;
}
