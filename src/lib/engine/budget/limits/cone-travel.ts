import { travel, type Limit } from './limit';

/** One-way peak travel within the linear range Xmax. */
export const coneTravel: Limit = { name: 'cone-travel', quantity: travel, allowed: (w) => w.driver.xmax };
