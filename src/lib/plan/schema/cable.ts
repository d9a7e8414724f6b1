import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity } from './keys';

/** Between amplifier and driver. */
export const cableSchema = z.strictObject({
  resistance_ohm: optional(
    quantity(0, 20),
    'Resistance of the whole loop, both conductors, with connectors and any passive coil, ohm.',
    DEFAULTS.resistance_ohm
  )
});
