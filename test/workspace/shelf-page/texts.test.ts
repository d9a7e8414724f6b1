import { describe, expect, test } from 'vitest';
import { levelDomain } from '$lib/workspace/shelf-page/level-domain';
import { PlanSearch } from '$lib/workspace/shelf-page/plan-search.svelte';
import { shortVerdict } from '$lib/workspace/shelf-page/short-verdict';
import { whenInFull, whenText } from '$lib/workspace/shelf-page/when-text';
import { planCalled, sessionWith } from './shelf';

/** ms since 1970 by the clock of the device, whatever its time zone. */
const at = (...date: [year: number, month: number, day: number, hour: number, minute: number]) =>
  new Date(date[0], date[1] - 1, ...(date.slice(2) as [number, number, number])).getTime();

describe('when a plan was changed', () => {
  const now = at(2026, 1, 2, 0, 30);
  test.for([
    ['today', at(2026, 1, 2, 0, 5), 'today 00:05'],
    ['a minute before midnight', at(2026, 1, 1, 23, 59), 'yesterday 23:59'],
    ['the day before, in the afternoon', at(2026, 1, 1, 14, 2), 'yesterday 14:02'],
    ['earlier, in another year', at(2025, 12, 31, 14, 2), '31 Dec 2025']
  ] as const)('%s', ([, then, text]) => {
    expect(whenText(then, now)).toBe(text);
  });

  test('earlier in the same year, without the year', () => {
    expect(whenText(at(2025, 11, 12, 9, 0), at(2025, 12, 1, 9, 0))).toBe('12 Nov');
  });

  test('in full', () => {
    expect(whenInFull(at(2025, 11, 12, 14, 2))).toMatch(/^12 November 2025.*14:02$/);
  });
});

describe('the verdict in short', () => {
  test.for([
    [
      'Holds. 101 dB at the seat down to 18.2 Hz with 3.4 dB in hand. Cone travel runs out first, at 19 Hz.',
      'Holds.',
      '101 dB at the seat down to 18.2 Hz with 3.4 dB in hand.'
    ],
    [
      'Does not hold. At 15 Hz the cone would need 20.5 mm of its 16 mm. 107.8 dB is the most; 110 dB is wanted.',
      'Does not hold.',
      'At 15 Hz the cone would need 20.5 mm of its 16 mm.'
    ],
    [
      'Holds, but falls 2.0 dB short at 20 Hz. 101 dB at the seat with 3.4 dB in hand.',
      'Holds,',
      'but falls 2.0 dB short at 20 Hz.'
    ],
    ['Does not hold.', 'Does not hold.', ''],
    ['Unusual.', '', 'Unusual.']
  ] as const)('%s', ([sentence, word, rest]) => {
    expect(shortVerdict(sentence)).toEqual({ word, rest });
  });
});

test('all small curves stand on one scale, which holds the loudest', () => {
  expect(levelDomain([[88, 101.4, 97], [110.2]])).toEqual([70, 112]);
  expect(levelDomain([[Number.NaN], [90]])).toEqual([49, 91]);
  expect(levelDomain([]).every(Number.isFinite)).toBe(true);
});

describe('search', () => {
  test('finds words of titles in any order, without case and accents', async () => {
    const { session } = await sessionWith(['Küche, left wall', 'Loft corner', 'Left loft']);
    const list = session.list ?? [];
    const search = new PlanSearch();
    const titles = (query: string) => {
      search.query = query;
      return search.found(list).map(({ title }) => title);
    };
    expect(titles('  ')).toHaveLength(3);
    expect(titles('kuche')).toEqual(['Küche, left wall']);
    expect(titles('LOFT left')).toEqual(['Left loft']);
    expect(titles('barn')).toEqual([]);
  });

  test('finds words of notes once they are read, and follows a change', async () => {
    const { session, shelf } = await sessionWith(['Loft', 'Den']);
    const { id } = await shelf.add(planCalled('Shed', { notes: 'For the Saturday people' }));
    await session.reload();
    const search = new PlanSearch();
    search.query = 'saturday';
    const titles = () => search.found(session.list ?? []).map(({ title }) => title);
    expect(titles()).toEqual([]);
    await search.readNotes(shelf, session.list ?? []);
    expect(titles()).toEqual(['Shed']);

    const shelved = await shelf.get(id);
    if (!shelved?.readable) return expect.unreachable();
    const plan = { ...shelved.record.plan, notes: 'For Sundays' };
    await shelf.put({ ...shelved.record, plan }, shelved.history);
    await session.reload();
    await search.readNotes(shelf, session.list ?? []);
    expect(titles()).toEqual([]);
  });
});
