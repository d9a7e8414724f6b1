import { z } from 'zod';
import { DEFAULTS } from '../defaults';
import { optional, quantity, required } from './keys';

const doubt = (initial: number) =>
  optional(
    quantity(0, 12),
    'How far the room may turn out better or worse than estimated, dB; margins are given with both.',
    initial
  );

const openAirSchema = z
  .strictObject({
    kind: required(z.literal('open-air'), 'Half space: on the ground, nothing else near.'),
    doubt_dB: doubt(DEFAULTS.doubt_outdoors_dB)
  })
  .meta({ description: 'Outdoors.' });

const pressureGainSchema = z
  .strictObject({
    kind: required(
      z.literal('pressure-gain'),
      'A closed room as an estimate: boundaries near the box, and pressure gain below its first mode.'
    ),
    length_m: required(quantity(1, 60), 'Length of the room, m.'),
    width_m: required(quantity(1, 60), 'Width of the room, m.'),
    height_m: required(quantity(1, 60), 'Height of the room, m.'),
    airtightness: optional(
      z.enum(['tight', 'typical', 'leaky']),
      'How well the room holds pressure: tight (masonry, doors shut) 18 dB of gain at most, typical 12, leaky (timber frame, open plan) 6.',
      DEFAULTS.airtightness
    ),
    cap_dB: optional(
      quantity(0, 40),
      'Most gain the room gives at the lowest notes, dB, in place of the figure of airtightness.'
    ),
    boundary_distances_m: optional(
      z.array(quantity(0, 30)).max(3),
      'Distances from the cone to up to three boundaries at right angles, the floor among them, m; left out, no boundary gain.'
    ),
    distance_loss_dB: optional(
      quantity(0, 10),
      'Level lost for each doubling of the distance, dB: 3 to 6 indoors.',
      DEFAULTS.distance_loss_dB
    ),
    doubt_dB: doubt(DEFAULTS.doubt_indoors_dB)
  })
  .meta({ description: 'A closed room, estimated.' });

/** Where the set plays. */
export const roomSchema = z.discriminatedUnion('kind', [pressureGainSchema, openAirSchema]);
