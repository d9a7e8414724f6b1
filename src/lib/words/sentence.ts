/** The verdict: one line that says whether the plan holds, by how much, what gives out first and where. */
import type { Budget, LimitMargin } from '$lib/engine/budget/budget';
import type { Chain } from '$lib/engine/chain';
import { findingWords } from './findings/finding-words';
import { capital, isPlural, limitName, listed } from './limit-names';
import { limitNeed } from './limit-need';
import { marginSize, marginText } from './margin-text';
import { aboutHertzText, dbText, hertzText, levelText, safeLevelText } from './quantities';

export function sentence(chain: Chain, budget: Budget): string {
  const parts = [...outcome(chain, budget), ...doubt(budget)];
  if (budget.notJudged.length > 0) parts.push(`Not judged: ${listed(budget.notJudged.map(limitName))}.`);
  return parts.join(' ');
}

function outcome(chain: Chain, budget: Budget): string[] {
  const worst = budget.limits.find((l) => l.limit === budget.verdict.limit);
  if (worst !== undefined && worst.margin < 0) return over(chain, budget, worst);
  if (!budget.verdict.holds) {
    const blocking = budget.findings.find((f) => f.severity === 'blocking');
    return ['Does not hold.', ...(blocking === undefined ? [] : [findingWords(blocking).fact])];
  }
  return holding(chain, budget);
}

function holding({ goal }: Chain, { goalShort, system, verdict }: Budget): string[] {
  const opening = goalShort.beyondTolerance
    ? `Holds, but falls ${dbText(goalShort.short)} short at ${aboutHertzText(goalShort.at)}.`
    : 'Holds.';
  const depth = system.f3 === null ? '' : ` down to ${hertzText(system.f3)}`;
  return [
    opening,
    `${levelText(goal.level)} at the seat${depth} with ${marginText(verdict.margin)}.`,
    `${capital(limitName(verdict.limit))} ${isPlural(verdict.limit) ? 'run' : 'runs'} out first, at ${aboutHertzText(verdict.worst)}.`
  ];
}

function over({ goal }: Chain, budget: Budget, worst: LimitMargin): string[] {
  const need = limitNeed(worst.limit, worst.demanded, worst.allowed);
  const slightly = worst.margin > -0.1 ? `, ${marginText(worst.margin)}` : '';
  return [
    'Does not hold.',
    `At ${aboutHertzText(worst.worst)} ${need}${slightly}.`,
    `${safeLevelText(budget.maxLevel)} is the most; ${levelText(goal.level)} is wanted.`
  ];
}

/** Said only where the room's doubt reaches far enough to turn the verdict, and nothing but limits decides it. */
function doubt({ findings }: Budget): string[] {
  const found = findings.find((f) => f.code === 'room-doubt');
  if (found?.code !== 'room-doubt') return [];
  if (findings.some((f) => f.severity === 'blocking' && !f.code.startsWith('limit-'))) return [];
  const turns = marginSize(found.facts.turnsAt);
  return [
    found.facts.holds
      ? `It holds unless the room gives ${turns} dB less than estimated.`
      : `It would hold if the room gave ${turns} dB more than estimated.`
  ];
}
