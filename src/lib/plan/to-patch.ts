/** The engine's changes, in SI, as a JSON Patch (RFC 6902) in the file's own units. */
import type { Change } from '$lib/engine/budget/budget';
import { DEFAULTS } from './defaults';
import type { JsonPatch } from './json-patch';
import { pointer, valueAt } from './json-pointer';
import type { Plan } from './schema';

/**
 * Operations to apply in order. A key the file has is replaced, one it lacks is added, parents included: nothing depends on how a library
 * takes `replace` on a path that is not there. Numbers are rounded to 10 significant digits, so that 0.085 m³ is 85 L.
 */
export function toPatch(plan: Plan, changes: readonly Change[]): JsonPatch {
  const writer = new PatchWriter(plan);
  for (const change of changes) write(writer, change);
  return writer.patch;
}

function write(to: PatchWriter, change: Change): void {
  switch (change.set) {
    case 'level':
      return to.set(['goal', 'level_dB'], clean(change.value));
    case 'goal-from':
      return to.set(['goal', 'from_Hz'], clean(change.value));
    case 'goal-to':
      return to.set(['goal', 'to_Hz'], clean(change.value));
    case 'block-corner': {
      const centred = to.at(['shaping', change.block, 'kind']) === 'peak';
      return to.set(['shaping', change.block, centred ? 'centre_Hz' : 'corner_Hz'], clean(change.value));
    }
    case 'block-to':
      return to.set(['shaping', change.block, 'to_Hz'], clean(change.value));
    case 'block-gain':
      return to.set(['shaping', change.block, 'gain_dB'], clean(change.value));
    case 'add-high-pass':
      return to.append(['shaping'], {
        kind: 'high-pass',
        family: 'butterworth',
        order: change.order,
        corner_Hz: clean(change.value)
      });
    case 'drivers':
      to.set(['driver', 'count'], change.count);
      return setWiring(to, 'driver_wiring', change.wiring, change.count);
    case 'wiring':
      setWiring(to, 'coil_wiring', change.coilWiring, to.at(['driver', 'coils']) ?? DEFAULTS.coils);
      return setWiring(
        to,
        'driver_wiring',
        change.driverWiring,
        to.at(['driver', 'count']) ?? DEFAULTS.count
      );
    case 'ratings':
      return change.powers.forEach((power, i) =>
        to.set(['amplifier', 'ratings', i, 'power_W'], clean(power))
      );
    case 'net-volume':
      to.remove(['box', 'inner_L']);
      return to.set(['box', 'net_L'], litres(change.value));
    case 'inner-volume':
      to.remove(['box', 'net_L']);
      return to.set(['box', 'inner_L'], litres(change.value));
    case 'cable':
      return to.set(['cable', 'resistance_ohm'], clean(change.value));
  }
}

/** Wiring matters where there is more than one to wire; a key that stands there without need is kept true. */
function setWiring(to: PatchWriter, key: 'coil_wiring' | 'driver_wiring', wiring: string, of: unknown): void {
  const path = ['driver', key];
  const stands = to.at(path) != null;
  if ((Number(of) > 1 || stands) && to.at(path) !== wiring) to.set(path, wiring);
}

const clean = (x: number): number => Number(x.toPrecision(10));
const litres = (cubicMetres: number): number => clean(cubicMetres * 1000);

/** Writes operations against a copy that follows them, so that each finds what the ones before it made. */
class PatchWriter {
  readonly patch: JsonPatch = [];
  private readonly copy: unknown;

  constructor(plan: Plan) {
    this.copy = structuredClone(plan);
  }

  at(path: readonly PropertyKey[]): unknown {
    return valueAt(this.copy, path);
  }

  set(path: readonly PropertyKey[], value: unknown): void {
    const parent = path.slice(0, -1);
    const key = path[path.length - 1];
    const holder = this.at(parent);
    if (typeof holder !== 'object' || holder === null) return this.set(parent, { [key]: value });
    this.patch.push({ op: Object.hasOwn(holder, key) ? 'replace' : 'add', path: pointer(path), value });
    (holder as Record<PropertyKey, unknown>)[key] = structuredClone(value);
  }

  append(path: readonly PropertyKey[], value: unknown): void {
    const list = this.at(path);
    if (!Array.isArray(list)) return this.set(path, [value]);
    this.patch.push({ op: 'add', path: pointer([...path, list.length]), value });
    list.push(structuredClone(value));
  }

  /** Takes a key out where it stands with a value. */
  remove(path: readonly PropertyKey[]): void {
    if (this.at(path) == null) return;
    this.patch.push({ op: 'remove', path: pointer(path) });
    delete (this.at(path.slice(0, -1)) as Record<PropertyKey, unknown>)[path[path.length - 1]];
  }
}
