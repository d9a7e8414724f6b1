/** Finding the unit someone wrote: "cu. ft.", "Ω", "ft^3", "Litres". */
import { kindOf, QUANTITIES, type Quantity } from './quantity';
import type { Unit } from './unit';

/** The same letters for every way of writing one unit; case is kept. */
const spelled = (name: string): string =>
  name
    .replace(/[ΩΩ]/g, 'ohm')
    .replace(/[µμ]/g, 'u')
    .replace(/²/g, '2')
    .replace(/³/g, '3')
    .replace(/''/g, '"')
    .replace(/[\s.,^·⋅*°_-]/g, '');

interface Index {
  readonly exact: ReadonlyMap<string, Unit>;
  /** By lower case; a name two units share this way is in neither. */
  readonly loose: ReadonlyMap<string, Unit>;
}

function indexOf(units: readonly Unit[]): Index {
  const exact = new Map<string, Unit>();
  const loose = new Map<string, Unit>();
  for (const unit of units)
    for (const name of [unit.symbol, ...unit.names].map(spelled)) {
      if (name === '') continue;
      if (!exact.has(name)) exact.set(name, unit);
      if (!loose.has(name.toLowerCase())) loose.set(name.toLowerCase(), unit);
    }
  return { exact, loose };
}

const INDEX = new Map<Quantity, Index>();

function index(quantity: Quantity): Index {
  let found = INDEX.get(quantity);
  if (found === undefined) INDEX.set(quantity, (found = indexOf(kindOf(quantity).units)));
  return found;
}

/** A capital M says mega: "MW" and "Mohm" are never taken for milliwatts and milliohms. */
const mega = (name: string): boolean => /^M(W|H|HZ|Hz|V|A|S|G|g|ohms?|OHMS?)$/.test(name);

/** The unit of this quantity that goes by `name`; null where there is none. */
export function findUnit(name: string, quantity: Quantity): Unit | null {
  const key = spelled(name);
  const { exact, loose } = index(quantity);
  return exact.get(key) ?? (mega(key) ? null : loose.get(key.toLowerCase())) ?? null;
}

/** The quantity that does have a unit of this name; null where none has. */
export function quantityWithUnit(name: string): Quantity | null {
  const all = Object.keys(QUANTITIES) as Quantity[];
  return all.find((quantity) => findUnit(name, quantity) !== null) ?? null;
}
