import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity } from './keys';

/** The box: `net_L`, or `inner_L`; never both. */
export const boxSchema = z.strictObject({
  inner_L: optional(
    quantity(0.2, 5000),
    'Volume between the panels, drivers and bracing not yet taken off, litres; in place of net_L.'
  ),
  bracing_L: optional(
    quantity(0, 500),
    'Everything inside the box that is not a driver, litres; taken off inner_L.',
    DEFAULTS.bracing_L
  ),
  net_L: optional(quantity(0.2, 5000), 'Volume of air as final, litres; in place of inner_L and bracing_L.'),
  fill_gain: optional(
    quantity(1, 1.4),
    'How much larger the fill makes the box act: 1 empty, 1.1 to 1.2 usual, 1.4 the limit in theory.',
    DEFAULTS.fill_gain
  ),
  q_absorption: optional(
    quantity(1, 1000),
    'Box Q from losses in fill and lining: 5 to 10 unfilled, 2 to 5 well filled; left out, no losses.'
  ),
  q_leakage: optional(quantity(1, 1000), 'Box Q from leaks; left out, airtight.')
});
