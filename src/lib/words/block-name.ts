/** Shaping blocks and stations as short lines: "low-pass 80 Hz", "transform to 24 Hz". */
import type { Chain } from '$lib/engine/chain';
import type { Block } from '$lib/engine/shaping/block';
import { significant } from './format-number';
import { dbText } from './quantities';

const hertz = (f: number): string => `${significant(f, 4)} Hz`;
const signed = (db: number): string => (db > 0 ? `+${dbText(db)}` : dbText(db));

/** What a block is, without its label. */
export function blockName(block: Block): string {
  switch (block.kind) {
    case 'low-pass':
    case 'high-pass':
      return `${block.kind} ${hertz(block.corner)}`;
    case 'linkwitz-transform':
      return `transform to ${hertz(block.to)}`;
    case 'low-shelf':
      return `low shelf ${signed(block.gain)}`;
    case 'peak':
      return `${block.gain < 0 ? 'dip' : 'peak'} at ${hertz(block.centre)}`;
    case 'gain':
      return `gain ${signed(block.gain)}`;
    case 'polarity':
      return 'polarity reversed';
    case 'delay':
      return `delay ${significant(block.delay * 1000, 3)} ms`;
    case 'all-pass':
      return `all-pass ${hertz(block.corner)}`;
    case 'section':
      return 'section by its coefficients';
  }
}

/** The room in a few words: its sides, or that there is none. */
export function roomName({ room }: Chain): string {
  if (room.kind === 'open-air') return 'open air';
  return [room.length, room.width, room.height].map((side) => significant(side, 3)).join(' × ');
}
