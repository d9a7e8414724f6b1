/** The lines that the demand is held against. Compared as numbers, so that a moved handle draws no curve again. */
import { ratedWatts } from '$lib/words/questions/amplifier-need';
import { reportedLimit } from '$lib/words/questions/report-limits';
import type { Report } from '$lib/words/report';
import type { DemandLimits } from './demand-panels';

export function demandLimits(report: () => Report): { readonly current: DemandLimits } {
  const allowed = (limit: Parameters<typeof reportedLimit>[1]) =>
    reportedLimit(report(), limit)?.allowed ?? null;
  const metres = (mm: number | null) => (mm === null ? null : mm / 1000);
  const ratedW = $derived(ratedWatts(report()));
  const load = $derived(report().driver.nominal_ohm ?? NaN);
  const volts = $derived(allowed('amplifier-voltage'));
  const xmax = $derived(metres(allowed('cone-travel')));
  const xmech = $derived(metres(allowed('mechanical-stop')));
  const current = $derived({ ratedW, load, volts, xmax, xmech });
  return {
    get current() {
      return current;
    }
  };
}
