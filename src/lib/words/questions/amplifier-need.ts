/**
 * What the plan asks of its amplifier and what that gives, in one unit. Watts are those of a data sheet: volts squared over the nominal
 * load. Where current runs out and voltage does not, amps say it; watts would hide it.
 */
import { apart } from '../format-number';
import { ohmText } from '../quantities';
import type { Report } from '../report';
import { reportedLimit } from './report-limits';

export interface AmplifierNeed {
  /** "961 W"; "22.4 A". */
  readonly needs: string;
  readonly has: string;
  /** " into 4 ohm"; empty for amps. */
  readonly into: string;
  readonly short: boolean;
}

type Figures = Pick<Report, 'limits' | 'demand' | 'driver'>;

/** W that the amplifier's volts make in the nominal load; null where the report lacks a figure. */
export function ratedWatts(report: Figures): number | null {
  const volts = reportedLimit(report, 'amplifier-voltage');
  const load = report.driver.nominal_ohm;
  return volts === null || load === null ? null : (volts.allowed * volts.allowed) / load;
}

export function amplifierNeed(report: Figures): AmplifierNeed {
  const volts = reportedLimit(report, 'amplifier-voltage');
  const amps = reportedLimit(report, 'amplifier-current');
  const inHand = volts?.margin ?? 0;
  if (amps !== null && amps.margin < 0 && inHand >= 0) {
    const [needs, has] = apart(amps.demanded, amps.allowed);
    return { needs: `${needs} A`, has: `${has} A`, into: '', short: true };
  }
  const [needs, has] = apart(report.demand.rated_W_nominal ?? NaN, ratedWatts(report) ?? NaN);
  return {
    needs: `${needs} W`,
    has: `${has} W`,
    into: ` into ${ohmText(report.driver.nominal_ohm ?? NaN)}`,
    short: inHand < 0
  };
}
