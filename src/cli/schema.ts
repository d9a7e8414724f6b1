/** `sealwright schema`: the JSON Schema of a plan. */
import { planJsonSchema } from '$lib/plan/json-schema';
import { readArguments } from './arguments';
import type { Command } from './io';
import { json } from './json';
import { UsageError } from './usage-error';

export const schema: Command = async (args, io) => {
  const { plans } = readArguments('schema', args, {});
  if (plans.length > 0) throw new UsageError(`schema takes no argument (got ${plans.length})`, 'schema');
  io.out(json(planJsonSchema()));
  return 0;
};
