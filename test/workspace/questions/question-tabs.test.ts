import { expect, test } from 'vitest';
import { questionTabs } from '$lib/workspace/questions/question-tabs';
import { examplePlan, openDesk } from './open-desk';

const tabs = (name: string, level: number) => {
  const plan = examplePlan(name, (p) => ({ ...p, goal: { ...p.goal, level_dB: level } }));
  const { desk } = openDesk(plan);
  return { report: desk.report, tabs: questionTabs(desk.report, 'metric') };
};

test('each question has its name and its answer as it stands', () => {
  const { tabs: all } = tabs('film-den', 100);
  expect(all.map(({ over, name }) => [over, name])).toEqual([
    ['volume', 'How big a box?'],
    ['boost', 'How much amplifier?'],
    ['level', 'How loud can it go?']
  ]);
  expect(all.map(({ short }) => short)).toEqual([false, false, false]);
  expect(all[0].answer).toMatch(/^95\.4 L net, Qtc 0\.\d\d$/);
});

test('short where the plan asks for more than there is', () => {
  // The cone is short at 110 dB, the amplifier only at 120 dB.
  expect(tabs('film-den', 110).tabs.map(({ short }) => short)).toEqual([false, false, true]);
  const loud = tabs('film-den', 120);
  expect(loud.tabs.map(({ short }) => short)).toEqual([false, true, true]);
  expect(loud.tabs[2].answer).toBe(tabs('film-den', 100).tabs[2].answer);
});
