import { z } from 'zod';
import { quantity, required } from './keys';

/** Where the listener sits. */
export const seatSchema = z.strictObject({
  distance_m: required(quantity(0.3, 100), 'Distance from the box to the seat, m.')
});
