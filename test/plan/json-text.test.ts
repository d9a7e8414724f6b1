import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { LARGEST_BYTES, readJsonText } from '$lib/plan/json-text';
import { formatProblem } from '$lib/plan/problem';

const lines = (input: string | Uint8Array): string[] => {
  const result = readJsonText(input);
  return result.ok ? [] : result.problems.map(formatProblem);
};
const value = (text: string): unknown => {
  const result = readJsonText(text);
  if (!result.ok) throw new Error(lines(text).join('\n'));
  return result.value;
};
const bytes = (text: string) => new TextEncoder().encode(text);

describe('the text of a file', () => {
  // Outside the project: the platform's own JSON.parse decides what is JSON and what it means.
  test('any JSON is read as JSON.parse reads it', () => {
    fc.assert(
      fc.property(fc.json({ maxDepth: 8 }), (text) => {
        const expected: unknown = JSON.parse(text, (_, v: unknown) => (v === 0 ? 0 : v));
        expect(JSON.stringify(value(text))).toBe(JSON.stringify(expected));
      }),
      { numRuns: 500, seed: 5 }
    );
  });

  test('what JSON.parse refuses is refused, what it takes is taken', () => {
    const piece = fc.constantFrom(
      '{',
      '}',
      '[',
      ']',
      ',',
      ':',
      '"a"',
      '"b"',
      '1',
      '-',
      '0',
      '.',
      'e',
      '+',
      'true',
      'null',
      ' ',
      '\n',
      '\t',
      '"',
      '\\',
      '\\u00e9',
      '\u00a0',
      '/',
      'NaN',
      "'"
    );
    fc.assert(
      fc.property(fc.array(piece, { minLength: 1, maxLength: 9 }), (pieces) => {
        const text = pieces.join('');
        let parsed = true;
        try {
          JSON.parse(text);
        } catch {
          parsed = false;
        }
        const result = readJsonText(text);
        const refusedForMore =
          !result.ok && result.problems.every((p) => /more than once|too large/.test(p.message));
        expect(result.ok || refusedForMore, text).toBe(parsed);
      }),
      { numRuns: 4000, seed: 6 }
    );
  });

  test('escapes', () => {
    const text = String.raw`"\"\\\/\b\f\n\r\t\u00e9\ud83d\ude00é"`;
    expect(value(text)).toBe(JSON.parse(text));
  });

  test('a byte-order mark and CRLF change nothing', () => {
    expect(value('\uFEFF{\r\n "a": 1\r\n}\r\n')).toEqual({ a: 1 });
    const result = readJsonText(new Uint8Array([0xef, 0xbb, 0xbf, ...bytes('[1]')]));
    expect(result).toEqual({ ok: true, value: [1] });
  });

  test.each([
    ['{"a": 1,\n "b": NaN}', 'not JSON: NaN is no number here (line 2, column 7).'],
    ['[-Infinity]', 'not JSON: -Infinity is no number here (line 1, column 2).'],
    ['{\r\n// mine\r\n}', 'not JSON: comments are not allowed (line 2, column 1).'],
    ['[1, 2,]', 'not JSON: there is a comma with nothing before ] (line 1, column 7).'],
    ['{"a": 1', 'not JSON: the text ends half way (line 1, column 8).'],
    ["{'a': 1}", 'not JSON: text stands in straight double quotation marks (line 1, column 2).'],
    ['{a: 1}', 'not JSON: a stands without quotation marks (line 1, column 2).'],
    ['[.5]', 'not JSON: a number starts with a digit, as in 0.5 (line 1, column 2).'],
    ['[007]', 'not JSON: a number does not start with 0 before another digit (line 1, column 2).'],
    ['{"a": 21,5}', 'not JSON: a decimal comma where a point belongs (line 1, column 10).'],
    ['[1.2.3]', 'not JSON: that is no number (line 1, column 2).'],
    ['[1] 2', 'not JSON: there is more after the end (line 1, column 5).'],
    ['["a\nb"]', 'not JSON: text in quotation marks runs over the end of its line (line 1, column 4).'],
    ['["\\x"]', 'not JSON: a backslash stands alone (line 1, column 3).'],
    ['["\\u12g4"]', 'not JSON: \\u needs four digits (line 1, column 3).'],
    ['', 'the file is empty: a plan is a JSON object.'],
    [' \n\t ', 'the file is empty: a plan is a JSON object.']
  ])('%j', (text, line) => expect(lines(text)).toEqual([line]));

  test('a key given twice is named with its path, once', () => {
    expect(lines('{"a": {"b": 1, "b": 2, "b": 3}, "a": 4}')).toEqual([
      '/a/b: b is given more than once: keep one.',
      '/a: a is given more than once: keep one.'
    ]);
    expect(lines('{"__proto__": 1, "__proto__": 2}')).toEqual([
      '/__proto__: __proto__ is given more than once: keep one.'
    ]);
  });

  test('a number too large is named with its path', () => {
    expect(lines('{"a": [0, -1e999]}')).toEqual(['/a/1: -1e999 is too large for a number.']);
    expect(lines(`[${'9'.repeat(400)}]`)).toEqual(['/0: this number is too large for a number.']);
    expect(value('[1e-999]')).toEqual([0]);
  });

  test('64 levels are read, one more is not, nor are 50 000', () => {
    const nested = (n: number) => '['.repeat(n) + ']'.repeat(n);
    expect(lines(nested(64))).toEqual([]);
    expect(lines(nested(65))[0]).toContain('nested more than 64 levels deep (line 1, column 65)');
    expect(lines(nested(50_000))[0]).toContain('nested more than 64');
    expect(lines('{"a":'.repeat(50_000))[0]).toMatch(/^\/a: .*nested more than 64/);
  });

  test('1 MiB is read, one byte more is not, in bytes or as text', () => {
    const text = (size: number) => `"${'x'.repeat(size - 2)}"`;
    expect(lines(text(LARGEST_BYTES))).toEqual([]);
    expect(lines(text(LARGEST_BYTES + 1))[0]).toContain('1 MiB');
    expect(lines(bytes(text(LARGEST_BYTES + 1)))[0]).toContain('1 MiB');
    // Two bytes a letter: half a MiB of letters and one more byte is too much.
    expect(lines(`"${'é'.repeat(LARGEST_BYTES / 2)}"`)[0]).toContain('1 MiB');
    expect(lines(`"${'é'.repeat(LARGEST_BYTES / 2 - 1)}"`)).toEqual([]);
  });

  test('UTF-16 is named, with its mark or without; other bytes are not UTF-8', () => {
    const utf16 = (text: string, little: boolean) =>
      Uint8Array.from([...text].flatMap((c) => (little ? [c.charCodeAt(0), 0] : [0, c.charCodeAt(0)])));
    for (const little of [true, false]) {
      expect(lines(utf16('{"a":1}', little))[0]).toContain('UTF-16');
      expect(lines(utf16('\uFEFF{"a":1}', little))[0]).toContain('UTF-16');
    }
    expect(lines(Uint8Array.from([0xff, 0xfe, 0x7b, 0x00]))[0]).toContain('UTF-16');
    expect(lines(Uint8Array.from([0x22, 0xc3, 0x28, 0x22]))[0]).toContain('not text in UTF-8');
  });
});
