import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity, required } from './keys';

const ratingSchema = z
  .strictObject({
    power_W: required(quantity(0.1, 20000), 'Rated power of one output into this load, W.'),
    load_ohm: required(quantity(0.25, 64), 'Load this power is rated into, ohm.')
  })
  .meta({ description: 'One rated power and its load.' });

/** The output that drives this load. */
export const amplifierSchema = z.strictObject({
  label: optional(z.string(), 'A name of your own for the amplifier.'),
  ratings: required(
    z.array(ratingSchema).min(1).max(16),
    'Rated powers of the one output that drives this load; two loads say volts and amps, one alone makes both bind there.'
  ),
  gain_dB: optional(quantity(-40, 80), 'Voltage gain from input to terminals, dB.'),
  output_ohm: optional(
    quantity(0, 50),
    'Output resistance, ohm; load over damping factor.',
    DEFAULTS.output_ohm
  ),
  minimum_load_ohm: optional(quantity(0.1, 64), 'Lowest nominal load the maker allows, ohm; left out, none.'),
  efficiency: optional(
    quantity(0.05, 1),
    'Share of the mains power that reaches the load, as a fraction: switching about 0.85, class AB about 0.5.',
    DEFAULTS.efficiency
  )
});
