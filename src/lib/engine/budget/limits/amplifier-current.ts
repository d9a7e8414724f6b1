import { current, type Limit } from './limit';

/** RMS amps the amplifier gives: max √(P/R) of its ratings. */
export const amplifierCurrent: Limit = {
  name: 'amplifier-current',
  quantity: current,
  allowed: (w) => w.ceiling.amps
};
