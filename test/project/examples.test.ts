import { readdirSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';

const folder = new URL('../../static/examples/', import.meta.url);
const read = (file: string): unknown => JSON.parse(readFileSync(new URL(file, folder), 'utf8'));
const index = read('index.json') as { file: string; title: string; about: string }[];

test('the list of examples names every plan in the folder once, and nothing else', () => {
  const plans = readdirSync(folder).filter((file) => file !== 'index.json');
  expect(index.map(({ file }) => file).sort()).toEqual(plans.sort());
});

test.for(index)(
  '$file is listed under its own title, with a line that tells what it shows',
  ({ file, title, about }) => {
    expect((read(file) as { title: string }).title).toBe(title);
    expect(about).toMatch(/^\S.{10,110}\.$/);
  }
);
