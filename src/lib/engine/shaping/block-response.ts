/** What each kind of block amounts to. A new kind adds its file and its line here; bypassed blocks never get this far. */
import type { Block } from './block';
import { allPass } from './all-pass';
import { linkwitzTransform, type BoxPole } from './linkwitz-transform';
import { lowShelf } from './low-shelf';
import { pass } from './pass';
import { peak } from './peak';
import { rawSection } from './raw-section';
import { response, type BlockResponse } from './section';

export function blockResponse(block: Block, box: BoxPole): BlockResponse {
  switch (block.kind) {
    case 'low-pass':
    case 'high-pass':
      return pass(block);
    case 'linkwitz-transform':
      return linkwitzTransform(block, box);
    case 'low-shelf':
      return lowShelf(block);
    case 'peak':
      return peak(block);
    case 'all-pass':
      return allPass(block);
    case 'section':
      return rawSection(block);
    case 'gain':
      return response({ gain: block.gain });
    case 'polarity':
      return response({ inverts: true });
    case 'delay':
      return response({ delay: block.delay });
  }
}
