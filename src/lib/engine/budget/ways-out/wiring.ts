import { loadChoices } from '../../driver/wiring';
import type { WayOut } from '../budget';
import type { Workings } from '../workings';
import { offer } from './cure';

/** Every other wiring whose load the amplifier is made for, lowest load first. */
export function wiringWaysOut(w: Workings): WayOut[] {
  const { driver, amplifier } = w.chain;
  return loadChoices(driver, amplifier.minimumLoad)
    .filter((c) => !c.belowMinimum)
    .map(({ coilWiring, driverWiring, nominal }) =>
      offer(w, 'wiring', [{ set: 'wiring', coilWiring, driverWiring }], {
        value: nominal,
        before: w.driver.nominal,
        nominal,
        coilWiring,
        wiring: driverWiring
      })
    )
    .filter((way) => way !== null);
}
