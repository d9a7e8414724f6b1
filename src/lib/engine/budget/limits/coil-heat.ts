/**
 * Current whose programme average heats the coil with its continuous rating. A steady tone with the programme's peak carries
 * (crest − a sine's 3.01) dB more average power than the programme does. Re cold, as wired: the rating is made so (common practice, no source).
 */
import { powerFromDb, SINE_CREST } from '../../quantity/decibel';
import { current, type Limit } from './limit';

export const coilHeat: Limit = {
  name: 'coil-heat',
  quantity: current,
  allowed: (w) =>
    w.driver.power === null
      ? null
      : Math.sqrt((w.driver.power * powerFromDb(w.chain.programme.crest - SINE_CREST)) / w.driver.coil.re)
};
