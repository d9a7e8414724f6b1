/**
 * A strict reader of JSON (RFC 8259) that says what `JSON.parse` cannot: line and column of a mistake, keys given twice,
 * numbers too large, and a limit on depth. `__proto__` becomes a key of the object like any other.
 */
import { likelyMistake } from './json-mistake';
import { pointer } from './json-pointer';
import { problem, type Problem } from './problem';
import { showKey } from './show-value';

export const DEEPEST = 64;

/** The text is no JSON: the reader stops here. */
class NotJson extends Error {
  constructor(
    readonly at: number,
    readonly what: string,
    readonly path: readonly string[] | null = null
  ) {
    super(what);
  }
}

/** Problems beyond this number are counted, not kept. */
const MOST_KEPT = 100;

/** `count` is how many problems there are, kept or not. */
export type JsonResult = { ok: true; value: unknown } | { ok: false; problems: Problem[]; count: number };

/** The value of a JSON text, or what is wrong with it. Never throws. */
export function readJson(text: string): JsonResult {
  const reader = new Reader(text);
  try {
    const value = reader.whole();
    const { problems, count } = reader;
    return count === 0 ? { ok: true, value } : { ok: false, problems, count };
  } catch (error) {
    if (error instanceof NotJson) return { ok: false, problems: [notJson(text, error)], count: 1 };
    throw error;
  }
}

function notJson(text: string, error: NotJson): Problem {
  const before = text.slice(0, error.at);
  const line = before.split('\n').length;
  const column = error.at - before.lastIndexOf('\n');
  const place = `line ${line}, column ${column}`;
  if (error.path !== null)
    return problem({
      path: pointer(error.path),
      found: `more than ${DEEPEST} levels`,
      allowed: `${DEEPEST} levels at most`,
      message: `lists and objects are nested more than ${DEEPEST} levels deep (${place}).`
    });
  return problem({
    path: '',
    found: error.what,
    allowed: 'JSON',
    message: `not JSON: ${error.what} (${place}).`
  });
}

const NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
const SPACE = /[ \t\r\n]*/y;
const QUOTE = 0x22;
const BACKSLASH = 0x5c;
const FIRST_PRINTABLE = 0x20;
const WORDS = [
  ['true', true],
  ['false', false],
  ['null', null]
] as const;
const ESCAPES: Record<string, string> = {
  '"': '"',
  '\\': '\\',
  '/': '/',
  b: '\b',
  f: '\f',
  n: '\n',
  r: '\r',
  t: '\t'
};

class Reader {
  readonly problems: Problem[] = [];
  count = 0;
  private readonly twice = new Set<string>();
  private at = 0;
  private depth = 0;
  private readonly path: string[] = [];

  constructor(private readonly text: string) {}

  whole(): unknown {
    this.space();
    const value = this.value();
    this.space();
    if (this.at < this.text.length) this.stop('there is more after the end');
    return value;
  }

  private value(): unknown {
    const c = this.text[this.at];
    if (c === '{') return this.object();
    if (c === '[') return this.list();
    if (c === '"') return this.string();
    if (c === '-' || (c >= '0' && c <= '9')) return this.number();
    for (const [word, meaning] of WORDS)
      if (this.text.startsWith(word, this.at)) {
        this.at += word.length;
        return meaning;
      }
    this.stop('a value is missing');
  }

  private object(): Record<string, unknown> {
    this.deeper();
    const object: Record<string, unknown> = {};
    this.space();
    while (this.text[this.at] !== '}') {
      if (this.text[this.at] !== '"')
        this.stop(
          this.afterDecimalComma()
            ? 'a decimal comma where a point belongs'
            : 'a key in double quotation marks is missing'
        );
      const key = this.string();
      this.space();
      this.take(':', 'a colon is missing');
      this.path.push(key);
      if (Object.hasOwn(object, key)) this.givenTwice(key);
      this.space();
      const value = this.value();
      // Assigning `__proto__` would change the object's prototype instead.
      if (key === '__proto__')
        Object.defineProperty(object, key, { value, enumerable: true, writable: true, configurable: true });
      else object[key] = value;
      this.path.pop();
      this.next('}');
    }
    this.at++;
    this.depth--;
    return object;
  }

  private list(): unknown[] {
    this.deeper();
    const list: unknown[] = [];
    this.space();
    while (this.text[this.at] !== ']') {
      this.path.push(String(list.length));
      list.push(this.value());
      this.path.pop();
      this.next(']');
    }
    this.at++;
    this.depth--;
    return list;
  }

  private deeper(): void {
    this.depth++;
    if (this.depth > DEEPEST) throw new NotJson(this.at, 'nesting', this.path.slice(0, 1));
    this.at++;
  }

  /** After a member: a comma and another, or the end. */
  private next(end: string): void {
    this.space();
    if (this.text[this.at] === end) return;
    this.take(',', `a comma or ${end} is missing`);
    this.space();
    if (this.text[this.at] === end) this.stop(`there is a comma with nothing before ${end}`);
  }

  private string(): string {
    let out = '';
    this.at++;
    for (;;) {
      out += this.plain();
      const c = this.text[this.at];
      if (c === '"') {
        this.at++;
        return out;
      }
      if (c !== '\\')
        this.stop(c === undefined ? '' : 'text in quotation marks runs over the end of its line');
      const escape = this.text[this.at + 1];
      if (escape === 'u') {
        const code = this.text.slice(this.at + 2, this.at + 6);
        if (!/^[\da-fA-F]{4}$/.test(code)) this.stop('\\u needs four digits');
        out += String.fromCharCode(parseInt(code, 16));
        this.at += 6;
      } else {
        const plain = Object.hasOwn(ESCAPES, escape ?? '')
          ? ESCAPES[escape]
          : this.stop('a backslash stands alone');
        out += plain;
        this.at += 2;
      }
    }
  }

  /** Characters that stand for themselves: all but quotation mark, backslash and control characters. */
  private plain(): string {
    const start = this.at;
    for (; this.at < this.text.length; this.at++) {
      const c = this.text.charCodeAt(this.at);
      if (c === QUOTE || c === BACKSLASH || c < FIRST_PRINTABLE) break;
    }
    return this.text.slice(start, this.at);
  }

  private number(): number {
    const start = this.at;
    const text = this.match(NUMBER);
    const after = this.text[this.at];
    if (text === '' || (after !== undefined && /[\d.\p{L}_]/u.test(after))) {
      this.at = start;
      this.stop('that is no number');
    }
    const value = Number(text);
    if (!Number.isFinite(value))
      this.complain(
        'a number that a computer can hold',
        `${text.length > 40 ? 'this number' : text} is too large for a number.`
      );
    // −0 and 0 are one quantity, and JSON written again would lose the sign.
    return value === 0 ? 0 : value;
  }

  private givenTwice(key: string): void {
    const path = pointer(this.path);
    if (!this.twice.has(path))
      this.complain('each key once', `${showKey(key)} is given more than once: keep one.`);
    this.twice.add(path);
  }

  /** A problem at the present path; reading goes on. */
  private complain(allowed: string, message: string): void {
    this.count++;
    if (this.count > MOST_KEPT) return;
    this.problems.push(problem({ path: pointer(this.path), found: message, allowed, message }));
  }

  /** As after `"level_dB": 21,` in `21,5`. */
  private afterDecimalComma(): boolean {
    return /\d,\d/.test(this.text.slice(Math.max(0, this.at - 2), this.at + 1));
  }

  private take(c: string, otherwise: string): void {
    if (this.text[this.at] !== c) this.stop(otherwise);
    this.at++;
  }

  private space(): void {
    SPACE.lastIndex = this.at;
    SPACE.test(this.text);
    this.at = SPACE.lastIndex;
  }

  private match(pattern: RegExp): string {
    pattern.lastIndex = this.at;
    const text = pattern.exec(this.text)?.[0] ?? '';
    this.at += text.length;
    return text;
  }

  /** Stops with the likeliest cause at this place, else with what was expected. */
  private stop(expected: string): never {
    const rest = this.text.slice(this.at, this.at + 40);
    throw new NotJson(this.at, likelyMistake(rest) ?? expected);
  }
}
