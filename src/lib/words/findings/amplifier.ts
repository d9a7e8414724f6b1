/** Findings about amplifier, cable and load. */
import type { LoadChoice } from '$lib/engine/budget/budget';
import { listed } from '../limit-names';
import { aboutHertzText, dbText, ohmText, percentText, qText } from '../quantities';
import { wiringText } from '../wiring-text';
import type { Circumstance, FactsOf, Said } from './said';

export function loadLow({ nominal, minimum, loads }: FactsOf<'load-low'>): Said {
  const enough = loads.filter((load) => !load.belowMinimum);
  return {
    fact: `The load of ${ohmText(nominal)} is below the amplifier's minimum load of ${ohmText(minimum)}.`,
    meaning:
      enough.length === 0
        ? 'No wiring of these coils and drivers reaches it: another driver or another amplifier is needed.'
        : `Wired otherwise: ${listed(choices(loads, enough), 'or')}.`
  };
}

/** Each wiring with its load; what all wirings share goes without saying. */
function choices(all: readonly LoadChoice[], shown: readonly LoadChoice[]): string[] {
  const coilsVary = all.some((load) => load.coilWiring !== all[0].coilWiring);
  const driversVary = all.some((load) => load.driverWiring !== all[0].driverWiring);
  return shown.map(
    ({ coilWiring, driverWiring, nominal }) =>
      `${wiringText(coilsVary ? coilWiring : null, driversVary ? driverWiring : null)} makes ${ohmText(nominal)}`
  );
}

export function cableLoss({ loss, qesRise, resistance }: FactsOf<'cable-loss'>): Said {
  return {
    fact: `The ${ohmText(resistance)} between amplifier and driver cost ${dbText(loss)} and raise Qes by ${percentText(qesRise)}.`,
    meaning:
      'Copper has 0.0175 ohm mm²/m: resistance is that times twice the length over the cross-section. Thicker or shorter.'
  };
}

export function sourceResistance({ qtcWith, qtcWithout, resistance }: FactsOf<'source-resistance'>): Said {
  return {
    fact: `The ${ohmText(resistance)} in series with the driver move Qtc from ${qText(qtcWithout)} to ${qText(qtcWith)}.`,
    meaning:
      'Amplifier output, cable and passive coils all damp the cone less; it is counted everywhere here.'
  };
}

export function singleRating(
  { lowestImpedance, load }: FactsOf<'single-rating'>,
  { at }: Circumstance
): Said {
  return {
    fact: `The amplifier has one rating, into ${ohmText(load)}, and the impedance falls to ${ohmText(lowestImpedance)}${at === null ? '' : ` at ${aboutHertzText(at)}`}.`,
    meaning:
      'Its amps are guessed from that one rating and bind below it: give a second rating into a lower load.'
  };
}
