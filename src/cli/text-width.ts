/** Columns a text takes in a terminal, and how to fill and fold to a width. ANSI colour takes none. */

// eslint's no-control-regex forbids writing ESC in a literal.
const ANSI = new RegExp(`${String.fromCharCode(27)}\\[[0-9;]*m`, 'g');
const ZERO_WIDTH = /[\p{Mn}\p{Me}\p{Cf}]/u;
/** East Asian wide forms and emoji, near enough for a title (Unicode Annex 11, from memory). */
const WIDE =
  /[\u1100-\u115f\u2e80-\u303e\u3041-\ua4cf\uac00-\ud7a3\uf900-\ufaff\ufe30-\ufe6f\uff00-\uff60\uffe0-\uffe6]|\p{Emoji_Presentation}/u;

const ASCII = /^[\x20-\x7e]*$/;

export function textWidth(text: string): number {
  if (ASCII.test(text)) return text.length;
  let width = 0;
  for (const c of text.replace(ANSI, '')) width += columnsOf(c);
  return width;
}

/** Below these code points nothing is empty, nothing wide: the costly patterns are seldom asked. */
const FIRST_EMPTY = 0x300;
const FIRST_WIDE = 0x1100;
const MINUS_SIGN = 0x2212;

function columnsOf(c: string): number {
  const code = c.codePointAt(0) as number;
  if (code < FIRST_EMPTY || code === MINUS_SIGN) return 1;
  if (ZERO_WIDTH.test(c)) return 0;
  return code >= FIRST_WIDE && WIDE.test(c) ? 2 : 1;
}

export const padEnd = (text: string, width: number): string =>
  text + ' '.repeat(Math.max(0, width - textWidth(text)));
export const padStart = (text: string, width: number): string =>
  ' '.repeat(Math.max(0, width - textWidth(text))) + text;

/** Folds at spaces to `width` columns; `first` opens the first line, `rest` the others. A longer word keeps its own line. */
export function fold(text: string, width: number, first = '', rest = first): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const lead = lines.length === 0 ? first : rest;
    if (line !== '' && textWidth(lead) + textWidth(line) + 1 + textWidth(word) > width) {
      lines.push(lead + line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  lines.push((lines.length === 0 ? first : rest) + line);
  return lines;
}
