import { describe, expect, test } from 'vitest';
import { planJsonSchema } from '$lib/plan/json-schema';

interface Node {
  description?: string;
  properties?: Record<string, Node>;
  required?: string[];
  additionalProperties?: boolean;
  anyOf?: Node[];
  oneOf?: Node[];
  items?: Node;
  default?: unknown;
  [key: string]: unknown;
}

const schema = planJsonSchema() as Node;

/** Every key of the schema with its path, through choices and lists. */
function* keys(node: Node, path = ''): Generator<[string, Node, Node]> {
  for (const [key, inner] of Object.entries(node.properties ?? {})) {
    yield [`${path}/${key}`, inner, node];
    yield* keys(inner, `${path}/${key}`);
  }
  for (const inner of [...(node.anyOf ?? []), ...(node.oneOf ?? [])]) yield* keys(inner, path);
  if (node.items) yield* keys(node.items, `${path}/-`);
}

const all = [...keys(schema)];

/** The keys of the file format, read off the page that fixes it. */
const NAMES =
  'format version title notes air temperature_C pressure_kPa goal level_dB from_Hz to_Hz pivot_Hz tolerance_dB programme lowest_Hz crest_factor_dB copies shaping kind family order corner_Hz from_q to_q gain_dB q centre_Hz delay_ms b a bypass label id fixed amplifier ratings power_W load_ohm output_ohm minimum_load_ohm efficiency cable resistance_ohm driver count coils coil_wiring driver_wiring fs_Hz qms qes qts vas_L re_ohm le_mH l2_mH r2_ohm sd_cm2 nominal_ohm mms_g cms_mm_per_N bl_Tm rms_kg_per_s xmax_mm xmech_mm facing coil_rise_K displacement_L box inner_L bracing_L net_L fill_gain q_absorption q_leakage room length_m width_m height_m airtightness cap_dB boundary_distances_m distance_loss_dB doubt_dB seat distance_m'.split(
    ' '
  );

describe('the JSON Schema', () => {
  test('has exactly the keys of the file format', () => {
    expect([...new Set(all.map(([path]) => path.split('/').at(-1)))].sort()).toEqual([...NAMES].sort());
  });

  test('every key has a description that is a sentence, and no object takes other keys', () => {
    for (const [path, node, parent] of all) {
      expect(node.description, path).toMatch(/^\S.+\.$/);
      expect(parent.additionalProperties, path).toBe(false);
    }
  });

  test('a key with a unit names it', () => {
    const units: Record<string, RegExp> = {
      Hz: /Hz|"box"/,
      dB: /dB/,
      L: /litres/,
      mm: /mm/,
      mH: /mH/,
      ohm: /ohm/,
      W: /\bW\b/,
      g: /\bg\b/,
      m: /\bm\b/,
      ms: /ms/,
      K: /\bK\b/,
      C: /°C/,
      kPa: /kPa/
    };
    for (const [path, node] of all) {
      const unit = /_([A-Za-z]+)$/.exec(path)?.[1] ?? '';
      if (Object.hasOwn(units, unit)) expect(node.description, path).toMatch(units[unit]);
    }
  });

  test('required keys are those of the file format', () => {
    const required = Object.fromEntries(all.map(([path, node]) => [path, node.required]));
    expect(schema.required).toEqual(['format', 'version', 'goal', 'amplifier', 'driver', 'box', 'seat']);
    expect(required['/goal']).toEqual(['level_dB', 'from_Hz', 'to_Hz']);
    expect(required['/amplifier']).toEqual(['ratings']);
    expect(required['/driver']).toEqual(['re_ohm', 'sd_cm2']);
    expect(required['/box']).toBeUndefined();
    expect(required['/seat']).toEqual(['distance_m']);
  });

  test('says what it is, and what it cannot check', () => {
    expect(schema.$schema).toBe('https://json-schema.org/draft/2020-12/schema');
    expect(schema.title).toContain('Sealwright');
    expect(schema.description).toContain('across keys');
    expect(schema.description).toContain('by the program alone');
    expect(all.find(([path]) => path === '/driver/coil_rise_K')?.[1].default).toBe(150);
    expect(JSON.stringify(schema)).not.toMatch(/\$ref/);
  });
});
