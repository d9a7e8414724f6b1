import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity } from './keys';

/** The air the set plays in. */
export const airSchema = z.strictObject({
  temperature_C: optional(quantity(-40, 60), 'Temperature of the air, °C.', DEFAULTS.temperature_C),
  pressure_kPa: optional(
    quantity(50, 110),
    'Pressure of the air where the box stands, not reduced to sea level, kPa.',
    DEFAULTS.pressure_kPa
  )
});
