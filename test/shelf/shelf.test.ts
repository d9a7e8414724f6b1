/** One contract for both kinds of shelf. */
import { beforeEach, describe, expect, test } from 'vitest';
import { serialisePlan } from '$lib/plan/serialise-plan';
import { canUndo, edit, EMPTY_HISTORY, undo, type Edited } from '$lib/shelf/history';
import type { Shelf } from '$lib/shelf/shelf';
import { ChangedElsewhere, NotOnShelf } from '$lib/shelf/shelf-error';
import {
  fakeWorld,
  freshBrowser,
  putPlan,
  readable,
  replace,
  SHELVES,
  smallPlan,
  type World
} from './specimen';

describe.for(SHELVES)('a $name shelf', ({ name, open }) => {
  let world: World;
  let shelf: Shelf;

  beforeEach(async () => {
    freshBrowser();
    world = fakeWorld();
    shelf = await open(world);
  });

  test('says what it is', () => {
    expect(shelf.kind).toBe(name);
    if (name === 'stored') expect(shelf.reason).toBeNull();
    else expect(shelf.reason?.text).toMatch(/^This browser stores nothing here\. Plans are kept until/);
  });

  test('starts empty', async () => {
    expect(await shelf.list()).toEqual([]);
    expect(await shelf.get('plan-1')).toBeNull();
    expect(await shelf.removed()).toEqual([]);
  });

  test('keeps a plan as it was typed, with its figures', async () => {
    const added = await shelf.add(smallPlan());
    const { record, history, revision } = await readable(shelf, added.id);
    expect(record.plan).toEqual(smallPlan());
    expect(record).toMatchObject({ id: 'plan-1', created: world.time, changed: world.time });
    expect(record.verdict?.sentence).toMatch(/^Holds, but falls/);
    expect(record.curve?.f).toHaveLength(48);
    expect(record.drafts).toBeUndefined();
    expect(history).toEqual(EMPTY_HISTORY);
    expect(revision).toBe(1);
    expect(await shelf.list()).toEqual([added]);
  });

  test('lists the plan changed last first', async () => {
    for (const title of ['One', 'Two', 'Three']) {
      await shelf.add(smallPlan(title));
      world.time += 1000;
    }
    const { record, history } = await readable(shelf, 'plan-1');
    await shelf.put({ ...record, changed: world.time }, history);
    expect((await shelf.list()).map(({ title }) => title)).toEqual(['One', 'Three', 'Two']);
  });

  test('keeps drafts of fields that cannot be read yet', async () => {
    const { id } = await shelf.add(smallPlan());
    const { record } = await readable(shelf, id);
    await shelf.put({ ...record, drafts: { '/goal/level_dB': '10o' } }, EMPTY_HISTORY);
    expect((await readable(shelf, id)).record.drafts).toEqual({ '/goal/level_dB': '10o' });
    await shelf.put(record, EMPTY_HISTORY);
    expect((await readable(shelf, id)).record.drafts).toBeUndefined();
  });

  test('hands out copies: what is done to them does not reach the shelf', async () => {
    const { id } = await shelf.add(smallPlan());
    const { record } = await readable(shelf, id);
    record.plan.goal.level_dB = 1;
    expect((await readable(shelf, id)).record.plan).toEqual(smallPlan());
  });

  test('keeps a history, and it can be walked after', async () => {
    const { id } = await shelf.add(smallPlan());
    let state: Edited = { plan: smallPlan(), history: EMPTY_HISTORY };
    for (let i = 1; i <= 150; i++)
      state = edit(state, replace('/goal/level_dB', 60 + i / 10), { label: `Step ${i}`, at: i * 5000 });
    state = undo(state);
    await putPlan(shelf, id, state.plan, state.history);
    const back = await readable(shelf, id);
    expect(back.history).toEqual(state.history);
    let walked: Edited = { plan: back.record.plan, history: back.history };
    while (canUndo(walked.history)) walked = undo(walked);
    expect(walked.plan).toEqual(smallPlan());
  });

  test('does not overwrite what was stored since, where told what was seen last', async () => {
    const { id, revision } = await shelf.add(smallPlan());
    const { record } = await readable(shelf, id);
    const louder = { ...record, plan: { ...record.plan, notes: 'Louder.' } };
    const second = await shelf.put(louder, EMPTY_HISTORY, { base: revision });
    expect(second.revision).toBe(revision + 1);
    await expect(shelf.put(record, EMPTY_HISTORY, { base: revision })).rejects.toThrow(ChangedElsewhere);
    expect((await readable(shelf, id)).record.plan.notes).toBe('Louder.');
    expect((await shelf.put(record, EMPTY_HISTORY)).revision).toBe(revision + 2);
    expect((await readable(shelf, id)).record.plan).toEqual(smallPlan());
  });

  test('takes a plan off and puts it back as it was', async () => {
    const { id } = await shelf.add(smallPlan());
    const before = await shelf.get(id);
    world.time += 5000;
    const restore = await shelf.remove(id);
    expect(await shelf.list()).toEqual([]);
    expect(await shelf.get(id)).toBeNull();
    expect((await shelf.removed()).map(({ at, summary }) => [at, summary.title])).toEqual([
      [world.time, 'Loft corner']
    ]);
    await restore();
    expect(await shelf.get(id)).toEqual(before);
    expect(await shelf.removed()).toEqual([]);
    await restore();
    expect(await shelf.get(id)).toEqual(before);
  });

  test('can be asked twice to remove or restore, as by two tabs', async () => {
    const { id } = await shelf.add(smallPlan());
    await shelf.remove(id);
    const restore = await shelf.remove(id);
    await restore();
    expect(await shelf.list()).toHaveLength(1);
    await expect(shelf.remove('nowhere')).rejects.toThrow(NotOnShelf);
    await expect(shelf.restore('nowhere')).rejects.toThrow(NotOnShelf);
  });

  test('a plan stored after its removal is on the shelf, and a late restore leaves it alone', async () => {
    const { id } = await shelf.add(smallPlan());
    const { record, revision } = await readable(shelf, id);
    const restore = await shelf.remove(id);
    const edited = { ...record, plan: { ...record.plan, notes: 'Still open in a tab.' } };
    await shelf.put(edited, EMPTY_HISTORY, { base: revision });
    await restore();
    expect((await readable(shelf, id)).record.plan.notes).toBe('Still open in a tab.');
    expect(await shelf.removed()).toEqual([]);
  });

  test('duplicates: a title of its own, no history, the original untouched', async () => {
    const { id } = await shelf.add(smallPlan());
    const edited = edit({ plan: smallPlan(), history: EMPTY_HISTORY }, replace('/goal/level_dB', 99), {
      label: 'Level',
      at: 0
    });
    await putPlan(shelf, id, edited.plan, edited.history);
    const original = await shelf.get(id);
    world.time += 5000;
    const copy = await shelf.duplicate(id);
    expect(copy).toMatchObject({
      title: 'Loft corner (copy)',
      created: world.time,
      changed: world.time,
      revision: 1
    });
    expect(copy.id).not.toBe(id);
    expect((await shelf.duplicate(id)).title).toBe('Loft corner (copy 2)');
    expect((await shelf.duplicate(copy.id)).title).toBe('Loft corner (copy 3)');
    const stored = await readable(shelf, copy.id);
    expect(stored.record.plan).toEqual({ ...edited.plan, title: 'Loft corner (copy)' });
    expect(stored.history).toEqual(EMPTY_HISTORY);
    expect(await shelf.get(id)).toEqual(original);
    await expect(shelf.duplicate('nowhere')).rejects.toThrow(NotOnShelf);
  });

  test('renames by an edit that can be undone', async () => {
    const { id } = await shelf.add(smallPlan());
    world.time += 5000;
    const renamed = await shelf.rename(id, 'Under the stairs');
    expect(renamed).toMatchObject({ id, title: 'Under the stairs', changed: world.time, revision: 2 });
    expect((await shelf.list())[0].title).toBe('Under the stairs');
    const { record, history } = await readable(shelf, id);
    expect(undo({ plan: record.plan, history }).plan).toEqual(smallPlan());
    await expect(shelf.rename('nowhere', 'x')).rejects.toThrow(NotOnShelf);
  });

  test('tells of every change, and of nothing that failed', async () => {
    const { id } = await shelf.add(smallPlan());
    await shelf.rename(id, 'x');
    const restore = await shelf.remove(id);
    await restore();
    await shelf.rename('nowhere', 'x').catch(() => undefined);
    expect(world.notices.map(({ kind }) => kind)).toEqual(['changed', 'changed', 'removed', 'changed']);
    expect(new Set(world.notices.map((notice) => notice.id))).toEqual(new Set([id]));
  });

  test('imports several files: the good ones stored, of the others what is wrong', async () => {
    const bad = smallPlan('Bad');
    bad.goal.level_dB = 1000;
    const results = await shelf.importTexts([
      { name: 'a.json', content: serialisePlan(smallPlan('First')) },
      { name: 'b.json', content: 'not JSON' },
      { name: 'c.json', content: serialisePlan(bad) },
      { name: 'd.json', content: new TextEncoder().encode(serialisePlan(smallPlan('Last'))) }
    ]);
    expect(results.map(({ name: file, ok }) => [file, ok])).toEqual([
      ['a.json', true],
      ['b.json', false],
      ['c.json', false],
      ['d.json', true]
    ]);
    expect((await shelf.list()).map(({ title }) => title)).toEqual(['First', 'Last']);
    expect(results[0]).toMatchObject({ id: 'plan-1', title: 'First' });
  });

  test('refresh works the figures out again and leaves plan, history and time alone', async () => {
    const { id } = await shelf.add(smallPlan());
    const { record, history } = await readable(shelf, id);
    await shelf.put({ ...record, verdict: null, curve: null, engineVersion: '0' }, history);
    world.time += 5000;
    await shelf.refresh(id);
    const after = await readable(shelf, id);
    expect(after.record).toEqual(record);
    expect(after.revision).toBe(2);
    await shelf.refresh('nowhere');
    expect(await shelf.list()).toHaveLength(1);
  });
});
