/** The JSON Schema of a plan file, made from the one definition in `schema.ts`. */
import { z } from 'zod';
import { planSchema } from './schema';
import { VERSION } from './version';

export function planJsonSchema(): Record<string, unknown> {
  const { $schema, ...schema } = z.toJSONSchema(planSchema, { io: 'input' });
  return {
    $schema,
    title: `Sealwright plan, version ${VERSION}`,
    description:
      'A sealed subwoofer for one room: goal, programme, shaping, amplifier, cable, driver, box, room and seat. ' +
      'Each quantity stands in the unit its key ends with. null says the same as leaving an optional key out. ' +
      'Rules across keys (such as to_Hz above from_Hz, or net_L or inner_L but not both) are checked by the program alone.',
    ...schema
  };
}
