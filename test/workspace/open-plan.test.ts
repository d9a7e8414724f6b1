import { readFileSync } from 'node:fs';
import { describe, expect, test, vi } from 'vitest';
import { LARGEST_FILE, OpenPlan } from '$lib/workspace/open-plan.svelte';
import { workThrough } from '$lib/workspace/work-through';

const read = (file: string) => readFileSync(`static/examples/${file}`, 'utf8');
const [{ file: FIRST }] = JSON.parse(read('index.json')) as { file: string }[];
const TEXT = read(FIRST);
const renamed = (title: string) => JSON.stringify({ ...(JSON.parse(TEXT) as object), title });

const source = (name: string, text: string, size?: number) => ({
  name,
  size,
  text: () => Promise.resolve(text)
});
const start = () => new OpenPlan(FIRST, TEXT);

describe('working a file through', () => {
  test('a plan gives its report', () => {
    const worked = workThrough('a.json', renamed('Under the stairs'));
    expect(worked.ok && worked.report.title).toBe('Under the stairs');
  });

  test('what is no plan gives its problems, each with its place', () => {
    const plan = JSON.parse(TEXT) as { goal: object };
    const worked = workThrough(
      'b.json',
      JSON.stringify({ ...plan, goal: { ...plan.goal, level_dB: 'loud' } })
    );
    expect(worked).toMatchObject({ ok: false, name: 'b.json' });
    expect(!worked.ok && worked.problems).toHaveLength(1);
    expect(!worked.ok && worked.problems[0]).toMatch(/^\/goal\/level_dB: /);
  });
});

describe('the open plan', () => {
  test('a page whose own example is no plan cannot be built', () => {
    expect(() => new OpenPlan('broken.json', '{}')).toThrow(/^broken\.json: /);
  });

  test('opening another plan shows it', async () => {
    const plan = start();
    expect(await plan.open(source('c.json', renamed('Under the stairs')))).toBe(true);
    expect(plan.shown.report.title).toBe('Under the stairs');
    expect(plan.refused).toBeNull();
  });

  test('a refused file leaves the plan alone, and a good one clears the refusal', async () => {
    const plan = start();
    const before = plan.shown;
    expect(await plan.open(source('d.json', 'not json'))).toBe(false);
    expect(plan.shown).toBe(before);
    expect(plan.refused?.name).toBe('d.json');
    expect(plan.refused?.problems.length).toBeGreaterThan(0);

    await plan.open(source('c.json', TEXT));
    expect(plan.refused).toBeNull();
  });

  test('a file that cannot be a plan is refused unread', async () => {
    const plan = start();
    const text = vi.fn(() => Promise.resolve(TEXT));
    expect(await plan.open({ name: 'film.json', size: LARGEST_FILE + 1, text })).toBe(false);
    expect(text).not.toHaveBeenCalled();
    expect(plan.refused?.problems[0]).toMatch(/larger than 1 MiB/);
    expect(await plan.open({ name: 'plan.json', size: LARGEST_FILE, text })).toBe(true);
  });

  test('a file that cannot be read says so', async () => {
    const plan = start();
    await plan.open({ name: 'gone.json', text: () => Promise.reject(new Error('gone')) });
    expect(plan.refused?.problems).toEqual([expect.stringMatching(/could not be read/)]);
  });

  test('of two that are under way the later one is shown, whichever arrives first', async () => {
    const plan = start();
    let arrive = (text: string): void => void text;
    const slow = plan.open({ name: 'slow.json', text: () => new Promise((resolve) => (arrive = resolve)) });
    const quick = plan.open(source('quick.json', renamed('Quick')));
    await quick;
    arrive(renamed('Slow'));
    expect(await slow).toBe(false);
    expect(plan.shown.report.title).toBe('Quick');
  });
});
