/** What the tabs of the three questions say, from the report alone: they stand there before anything is swept. */
import type { SweepOver } from '$lib/engine/budget/sweep-types';
import { amplifierNeed } from '$lib/words/questions/amplifier-need';
import { reportedLimits } from '$lib/words/questions/report-limits';
import { amplifierTab, boxTab, levelTab, QUESTION_NAMES } from '$lib/words/questions/tab-answers';
import type { Report } from '$lib/words/report';
import type { System } from '$lib/words/units/unit';

export interface QuestionTab {
  readonly over: SweepOver;
  /** "How big a box?" */
  readonly name: string;
  /** "85 L net, Qtc 0.82". */
  readonly answer: string;
  /** The answer falls short of what the plan asks. */
  readonly short: boolean;
}

export function questionTabs(report: Report, system: System): QuestionTab[] {
  const tab = (over: SweepOver, answer: string, short: boolean): QuestionTab => ({
    over,
    name: QUESTION_NAMES[over],
    answer,
    short
  });
  return [
    // A box is as big as it is: what it falls short of, amplifier and level say.
    tab('volume', boxTab(report, system), false),
    tab('boost', amplifierTab(report), amplifierNeed(report).short),
    tab(
      'level',
      levelTab(report),
      reportedLimits(report).some(({ margin }) => margin < 0)
    )
  ];
}
