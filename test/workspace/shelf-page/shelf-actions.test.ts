import { strFromU8, unzipSync } from 'fflate';
import { expect, test, vi } from 'vitest';
import { formatProblem } from '$lib/plan/problem';
import { readPlan } from '$lib/plan/read-plan';
import { ShelfFull } from '$lib/shelf/shelf-error';
import { actionsWith, fileOf, planCalled } from './shelf';

test('a copy has a title of its own and is said', async () => {
  const { actions, plan, titlesNow } = await actionsWith(['Loft', 'Den']);
  const copy = await actions.duplicate(plan('Den'));
  expect(copy?.title).toBe('Den (copy)');
  expect(titlesNow()).toEqual(['Den (copy)', 'Loft', 'Den']);
  expect(actions.said).toBe('Den (copy) added.');
});

test('renaming trims, and a title of nothing or the same changes nothing', async () => {
  const { actions, plan, titlesNow, session } = await actionsWith(['Loft']);
  const before = plan('Loft').revision;
  await actions.rename(plan('Loft'), '   ');
  await actions.rename(plan('Loft'), ' Loft ');
  expect(plan('Loft').revision).toBe(before);
  await actions.rename(plan('Loft'), ' Under the stairs ');
  expect(titlesNow()).toEqual(['Under the stairs']);
  expect(session.list?.[0].revision).toBe(before + 1);
});

test('deleted plans come back last first, each as it was', async () => {
  const { actions, plan, titlesNow, session } = await actionsWith(['Loft', 'Den', 'Shed']);
  const before = session.list;
  expect(await actions.remove(plan('Loft'))).toBe(true);
  expect(await actions.remove(plan('Shed'))).toBe(true);
  expect(titlesNow()).toEqual(['Den']);
  expect(actions.deleted.map(({ title }) => title)).toEqual(['Loft', 'Shed']);
  expect(session.removed).toHaveLength(2);

  expect((await actions.restore())?.title).toBe('Shed');
  expect(actions.said).toBe('Shed is back.');
  expect((await actions.restore())?.title).toBe('Loft');
  expect(session.list).toEqual(before);
  expect(actions.deleted).toEqual([]);
  expect(await actions.restore()).toBeNull();
});

test('a plan put back by name is no longer offered to be put back', async () => {
  const { actions, plan } = await actionsWith(['Loft', 'Den']);
  const loft = plan('Loft');
  await actions.remove(loft);
  await actions.remove(plan('Den'));
  await actions.restore(loft);
  expect(actions.deleted.map(({ title }) => title)).toEqual(['Den']);
});

test('a plan is exported under its title, as it is stored', async () => {
  const { actions, plan, exportFile } = await actionsWith(['Loft corner']);
  await actions.export(plan('Loft corner'));
  expect(exportFile).toHaveBeenCalledOnce();
  const [name, text] = exportFile.mock.calls[0];
  expect(name).toBe('loft-corner.sealwright.json');
  expect(JSON.parse(text as string)).toEqual(planCalled('Loft corner'));
});

test('all plans leave in one archive named after the day', async () => {
  const { actions, exportFile } = await actionsWith(['Loft', 'Loft', 'Den']);
  await actions.exportAll();
  const [name, bytes] = exportFile.mock.calls[0];
  expect(name).toBe('sealwright-plans-2026-01-05.zip');
  const files = unzipSync(bytes as Uint8Array);
  expect(Object.keys(files).sort()).toEqual([
    'den.sealwright.json',
    'loft-2.sealwright.json',
    'loft.sealwright.json'
  ]);
  expect(JSON.parse(strFromU8(files['den.sealwright.json']))).toEqual(planCalled('Den'));
  expect(actions.said).toBe('3 plans exported as sealwright-plans-2026-01-05.zip.');
});

test('of several files the plans are stored and the others explained in the words of the command line', async () => {
  const { actions, titlesNow } = await actionsWith(['Loft']);
  const broken = JSON.stringify({ ...planCalled('Broken'), goal: { level_dB: 'loud' } });
  const read = readPlan(broken);
  await actions.import([
    fileOf('den.json', planCalled('Den')),
    fileOf('broken.json', broken),
    fileOf('shopping.txt', 'two sheets of birch'),
    fileOf('shed.json', planCalled('Shed'))
  ]);
  expect(titlesNow()).toEqual(['Shed', 'Den', 'Loft']);
  expect(actions.said).toBe('2 plans added.');
  expect(actions.refused.map(({ name }) => name)).toEqual(['broken.json', 'shopping.txt']);
  expect(read.ok).toBe(false);
  expect(actions.refused[0].problems).toEqual(read.ok ? [] : read.problems.map(formatProblem));

  await actions.import([fileOf('broken.json', planCalled('Mended'))]);
  expect(actions.refused).toEqual([]);
  expect(titlesNow()?.[0]).toBe('Mended');
});

test('a file in another encoding is refused as on the command line, not garbled', async () => {
  const { actions, titlesNow } = await actionsWith([]);
  const utf16 = new Uint8Array(
    new Uint16Array(
      [0xfeff, ...JSON.stringify(planCalled('Den'))].map((c) => (typeof c === 'number' ? c : c.charCodeAt(0)))
    ).buffer
  );
  const read = readPlan(utf16);
  await actions.import([new File([utf16], 'den.json')]);
  expect(titlesNow()).toEqual([]);
  expect(actions.refused[0].problems).toEqual(read.ok ? [] : read.problems.map(formatProblem));
  expect(actions.refused[0].problems[0]).toMatch(/UTF-8/);
});

test('what stands in the way is said, and gone with the next thing done', async () => {
  const { actions, plan, shelf } = await actionsWith(['Loft']);
  const gone = { id: 'gone', title: 'Gone' };
  expect(await actions.duplicate(gone)).toBeNull();
  expect(actions.trouble).toBe('This plan is not on the shelf of this device.');
  expect(await actions.remove(gone)).toBe(false);
  expect(actions.deleted).toEqual([]);

  vi.spyOn(shelf, 'duplicate').mockRejectedValueOnce(new ShelfFull());
  await actions.duplicate(plan('Loft'));
  expect(actions.trouble).toMatch(/^There is no room left on this device\./);
  await actions.export(plan('Loft'));
  expect(actions.trouble).toBeNull();
});
