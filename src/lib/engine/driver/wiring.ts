/**
 * Coils of a driver and drivers of a box joined into one load.
 * The coils of one driver share one flux: inductance in series grows with k², in parallel stays (circuit theory, coupling 1).
 * Drivers have fluxes of their own: inductance in series grows with N, in parallel shrinks by N.
 */
import type { CoilWiring, DriverSheet, DriverWiring } from '../chain';

/** Usual nominal loads, Ω (common practice, no source). */
const NOMINALS = [1, 2, 4, 6, 8, 12, 16, 32];
/** Lowest DC resistance of a nominal load is 80 % of it: IEC 60268-5, from memory. */
const NOMINAL_OVER_RE = 1.25;

/** Nominal load of one coil: as given, else the usual one nearest by ratio to 1.25·Re. Ω. */
export function coilNominal(re: number, given: number | null): number {
  if (given !== null) return given;
  const target = Math.log(NOMINAL_OVER_RE * re);
  let best = NOMINALS[0];
  for (const n of NOMINALS) if (Math.abs(Math.log(n) - target) < Math.abs(Math.log(best) - target)) best = n;
  return best;
}

/** Factor on a coil's resistance when k coils are wired so. */
export function coilFactor(wiring: CoilWiring, k: number): number {
  return wiring === 'series' ? k : wiring === 'parallel' ? 1 / k : 1;
}

/** Factor on a driver's load when n drivers are wired so. */
export const driverFactor = (wiring: DriverWiring, n: number): number => (wiring === 'series' ? n : 1 / n);

/** Nominal load of the whole, Ω. */
export function nominalLoad(sheet: DriverSheet, coilWiring: CoilWiring, driverWiring: DriverWiring): number {
  return (
    coilNominal(sheet.re, sheet.nominal) *
    coilFactor(coilWiring, sheet.coils) *
    driverFactor(driverWiring, sheet.count)
  );
}

/** Every wiring of these coils and drivers, lowest load first; those below `minimum` are marked. */
export function loadChoices(
  sheet: DriverSheet,
  minimum: number
): { coilWiring: CoilWiring; driverWiring: DriverWiring; nominal: number; belowMinimum: boolean }[] {
  const coils: CoilWiring[] = sheet.coils > 1 ? ['parallel', 'single', 'series'] : ['single'];
  const drivers: DriverWiring[] = sheet.count > 1 ? ['parallel', 'series'] : ['parallel'];
  return coils
    .flatMap((coilWiring) =>
      drivers.map((driverWiring) => {
        const nominal = nominalLoad(sheet, coilWiring, driverWiring);
        return { coilWiring, driverWiring, nominal, belowMinimum: nominal < minimum * (1 - 1e-9) };
      })
    )
    .sort((a, b) => a.nominal - b.nominal);
}
