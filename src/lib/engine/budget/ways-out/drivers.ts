import type { DriverWiring } from '../../chain';
import { nominalLoad } from '../../driver/wiring';
import type { Change, WayOut } from '../budget';
import { boxSetting, LARGEST_BOX } from '../box-setting';
import type { Workings } from '../workings';
import { cures, offer, roundTo, tryChanges, type Cure } from './cure';

const MOST_DRIVERS = 16;
const WIRINGS: readonly DriverWiring[] = ['parallel', 'series'];
/** Above this Qtc more drivers in the same box are no honest cure. */
const HIGHEST_QTC = 0.9;

/** The fewest more drivers, in the same box or each with the room it has now, whose load the amplifier is made for. */
export function driversWayOut(w: Workings, cure: Cure): WayOut | null {
  const { chain } = w;
  const { count } = chain.driver;
  for (let n = count + 1; n <= MOST_DRIVERS; n++) {
    for (const scaled of [false, true]) {
      const box = boxSetting(chain, (w.driver.displacement * n) / count);
      const volume = roundTo((w.alignment.net * n) / count + box.taken, 1e-3, 'up');
      if (scaled && volume > LARGEST_BOX) continue;
      for (const wiring of WIRINGS) {
        const nominal = nominalLoad({ ...chain.driver, count: n }, chain.driver.coilWiring, wiring);
        if (nominal < chain.amplifier.minimumLoad * (1 - 1e-9)) continue;
        const changes: Change[] = [{ set: 'drivers', count: n, wiring }];
        if (scaled) changes.push(box.change(volume));
        const after = tryChanges(chain, changes);
        if (after === null || !(after.alignment.qtc <= Math.max(HIGHEST_QTC, w.alignment.qtc * 1.01)))
          continue;
        if (!cures(after, cure, true) || !cures(after, cure)) continue;
        return offer(w, scaled ? 'drivers-and-box' : 'drivers', changes, {
          value: scaled ? after.alignment.net : n,
          before: count,
          count: n,
          wiring,
          nominal
        });
      }
    }
  }
  return null;
}
