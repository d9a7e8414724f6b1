/** How coils and drivers are wired, in words. */
import type { CoilWiring, DriverSheet, DriverWiring } from '$lib/engine/chain';

const COILS: { readonly [W in CoilWiring]: string } = {
  single: 'one coil alone',
  series: 'coils in series',
  parallel: 'coils in parallel'
};

/** "coils in series, drivers in parallel"; null leaves a half out. */
export function wiringText(coils: CoilWiring | null, drivers: DriverWiring | null): string {
  return [
    ...(coils === null ? [] : [COILS[coils]]),
    ...(drivers === null ? [] : [`drivers in ${drivers}`])
  ].join(', ');
}

/** Only what there is a choice of: nothing for one driver of one coil. */
export function wiringOf({ count, coils, coilWiring, driverWiring }: DriverSheet): string {
  return wiringText(coils > 1 ? coilWiring : null, count > 1 ? driverWiring : null);
}
