/** What a report says of one limit. */
import type { LimitName } from '$lib/engine/budget/budget';
import { LIMIT_UNITS } from '../limit-names';
import type { Report } from '../report';

export interface ReportedLimit {
  readonly limit: LimitName;
  /** dB. */
  readonly margin: number;
  readonly worstHz: number;
  /** In the limit's own unit: V or A RMS, mm. */
  readonly demanded: number;
  readonly allowed: number;
}

const number = (value: unknown): number => (typeof value === 'number' ? value : NaN);

export function reportedLimits({ limits }: Pick<Report, 'limits'>): ReportedLimit[] {
  return limits.map((l) => {
    const { unit } = LIMIT_UNITS[l.limit];
    const figures: Readonly<Record<string, unknown>> = l;
    return {
      limit: l.limit,
      margin: number(l.margin_dB),
      worstHz: number(l.worst_Hz),
      demanded: number(figures[`demanded_${unit}`]),
      allowed: number(figures[`allowed_${unit}`])
    };
  });
}

export const reportedLimit = (report: Pick<Report, 'limits'>, name: LimitName): ReportedLimit | null =>
  reportedLimits(report).find((l) => l.limit === name) ?? null;
