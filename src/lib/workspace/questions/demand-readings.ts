/** Figures of the demand at the handle: the plan as it stands, against what it has. */
import type { LimitName } from '$lib/engine/budget/budget';
import { voltsText, wattsText } from '$lib/words/quantities';
import { reportedLimit } from '$lib/words/questions/report-limits';
import type { Report } from '$lib/words/report';
import { roundedText } from '$lib/words/units/quantity-text';
import type { System } from '$lib/words/units/unit';
import { reading, type ReadingPart } from './panel-data';

const isOver = (report: Report, limit: LimitName): boolean => (reportedLimit(report, limit)?.margin ?? 0) < 0;

export const wattsReading = (report: Report): ReadingPart[] => [
  reading(wattsText(report.demand.rated_W_nominal ?? NaN), isOver(report, 'amplifier-voltage'))
];

export const voltsReading = (report: Report): ReadingPart[] => [
  reading(
    voltsText(reportedLimit(report, 'amplifier-voltage')?.demanded ?? NaN),
    isOver(report, 'amplifier-voltage')
  )
];

export const travelReading = (report: Report, system: System): ReadingPart[] => [
  reading(
    roundedText(report.demand.cone_travel_mm ?? NaN, 'length-small', system),
    isOver(report, 'cone-travel')
  )
];
