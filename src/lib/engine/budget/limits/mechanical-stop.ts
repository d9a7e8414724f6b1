import { travel, type Limit } from './limit';

/** One-way peak travel before the cone strikes its stop, Xmech. */
export const mechanicalStop: Limit = {
  name: 'mechanical-stop',
  quantity: travel,
  allowed: (w) => w.driver.xmech
};
