import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { planJsonSchema } from '$lib/plan/json-schema';

test('the JSON Schema that ships is the one the plan file makes (npm run schema)', () => {
  const shipped: unknown = JSON.parse(readFileSync('static/plan.schema.json', 'utf8'));
  expect(shipped).toEqual(JSON.parse(JSON.stringify(planJsonSchema())));
});
