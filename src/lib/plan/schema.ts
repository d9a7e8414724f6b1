/**
 * The plan file, version 1: the one definition of its keys, ranges and choices. Rules across keys are in `rules/`.
 * Each quantity stands in the unit its key ends with; what is typed is what is stored, so no default is filled in here.
 */
import { z } from 'zod';
import { DEFAULTS } from './defaults';
import { airSchema } from './schema/air';
import { amplifierSchema } from './schema/amplifier';
import { blockSchema, MOST_BLOCKS } from './schema/blocks/blocks';
import { boxSchema } from './schema/box';
import { cableSchema } from './schema/cable';
import { driverSchema } from './schema/driver';
import { goalSchema } from './schema/goal';
import { optional, required, whole } from './schema/keys';
import { programmeSchema } from './schema/programme';
import { roomSchema } from './schema/room';
import { seatSchema } from './schema/seat';
import { FORMAT, VERSION } from './version';

export const planSchema = z.strictObject({
  format: required(z.literal(FORMAT), 'Says that this is a plan file.'),
  version: required(z.literal(VERSION), 'Version of the plan file.'),
  title: optional(z.string(), 'What the plan is called.', DEFAULTS.title),
  notes: optional(z.string(), 'Anything worth remembering.'),
  air: optional(airSchema, 'The air: left out, 20 °C and 101.325 kPa.'),
  goal: required(goalSchema, 'What is wanted at the seat.'),
  programme: optional(programmeSchema, 'What is played: left out, down to 10 Hz with 9 dB of crest.'),
  copies: optional(
    whole(1, 16),
    'Identical complete sets standing together; every demand is of one set.',
    DEFAULTS.copies
  ),
  shaping: optional(z.array(blockSchema).max(MOST_BLOCKS), 'Line-level blocks in signal order.', []),
  amplifier: required(amplifierSchema, 'The amplifier, one output of it.'),
  cable: optional(cableSchema, 'Between amplifier and driver: left out, no resistance.'),
  driver: required(driverSchema, 'The driver: one data sheet, how many, how wired.'),
  box: required(boxSchema, 'The sealed box: net_L, or inner_L.'),
  room: optional(roomSchema, 'Where the set plays: left out, open air.'),
  seat: required(seatSchema, 'Where the listener sits.')
});

/** A plan as stored: what the user typed, in the file's units, defaults not filled in. */
export type Plan = z.input<typeof planSchema>;
