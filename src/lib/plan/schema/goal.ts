import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity, required } from './keys';

/** What is wanted at the seat. */
export const goalSchema = z.strictObject({
  level_dB: required(
    quantity(40, 150),
    'Level wanted at the seat, dB re 20 µPa RMS of a steady tone, delivered at the pivot.'
  ),
  from_Hz: required(quantity(5, 200), 'Lowest frequency at which the level is wanted, Hz.'),
  to_Hz: required(quantity(10, 500), 'Highest frequency at which the level is wanted, above from_Hz, Hz.'),
  pivot_Hz: optional(
    quantity(5, 500),
    'Frequency at which the level is delivered exactly, inside the band, Hz; left out, 50 Hz moved into the band.'
  ),
  tolerance_dB: optional(
    quantity(0, 20),
    'How far the delivered level may fall short inside the band before it is called short, dB.',
    DEFAULTS.tolerance_dB
  )
});
