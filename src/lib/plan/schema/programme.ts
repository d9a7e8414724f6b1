import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity } from './keys';

/** What is played. */
export const programmeSchema = z.strictObject({
  lowest_Hz: optional(quantity(1, 200), 'Lowest frequency the programme holds, Hz.', DEFAULTS.lowest_Hz),
  crest_factor_dB: optional(
    quantity(3.01, 30),
    'Peak over long-term RMS of the programme, dB: 3.01 a steady tone, 6 dense music, 9 to 12 film.',
    DEFAULTS.crest_factor_dB
  )
});
