/** What every full report says once, whatever the plan: matters this program cannot judge. */
import type { Exposure } from '$lib/engine/budget/budget';
import { fixed } from './format-number';
import { aboutHertzText } from './quantities';

/** Peak, dB(C): lower action value of Directive 2003/10/EC, from memory. */
export const LOWER_ACTION_PEAK = 135;

export function cautions(exposure: Exposure): string[] {
  return [hearing(exposure), ...STANDING];
}

function hearing({ peakC, peakCAt }: Exposure): string {
  const side = peakC < LOWER_ACTION_PEAK ? 'below' : 'at or above';
  return (
    `Hearing: the subwoofer's peaks reach ${fixed(peakC, 1)} dB(C) at the seat, near ${aboutHertzText(peakCAt)}, ${side} the ` +
    `${LOWER_ACTION_PEAK} dB(C) lower action value of Directive 2003/10/EC (from memory). The main speakers decide as much: ` +
    'measure the whole system, by your local noise rules; this tool cannot tell hearing safety.'
  );
}

/** The same for every plan, so that several plans in one report say them once. */
export const STANDING: readonly string[] = [
  'Mains: wiring inside an amplifier or to a supply follows your local electrical code and belongs to a licensed electrician.',
  'Lifting: a loaded box is heavy; lift with two people or a trolley, by the rules for manual handling where you work.',
  'Dust: cutting board, fibre fill and glue give dust and fumes; mask, extraction and local workplace rules come first.',
  'Hanging loads: nothing hangs or stands overhead without rated fixings, local building codes and a licensed rigger or engineer.'
];
