/** The bytes or the text of a file as a value: UTF-8, JSON, at most 1 MiB. */
import { readJson, type JsonResult } from './json-reader';
import { problem } from './problem';

export const LARGEST_BYTES = 1024 * 1024;

/** The value, or what is wrong with the file as text. Never throws. */
export function readJsonText(input: string | Uint8Array): JsonResult {
  const size = typeof input === 'string' ? utf8Length(input) : input.length;
  if (size > LARGEST_BYTES)
    return refuse(
      `${size} bytes`,
      '1 MiB at most',
      `the file has ${size} bytes: a plan has 1 MiB (${LARGEST_BYTES} bytes) at most.`
    );
  const text = typeof input === 'string' ? input : decode(input);
  if (text === null) {
    const utf16 = looksLikeUtf16(input as Uint8Array);
    return utf16
      ? refuse('UTF-16 text', 'text in UTF-8', 'the file is text in UTF-16: save it as UTF-8.')
      : refuse('bytes that are not UTF-8', 'text in UTF-8', 'the file is not text in UTF-8.');
  }
  const plain = text.startsWith('\uFEFF') ? text.slice(1) : text;
  if (plain.trim() === '')
    return refuse('an empty file', 'JSON', 'the file is empty: a plan is a JSON object.');
  return readJson(plain);
}

/** The text, or null where the bytes are not UTF-8 or hold NULs, as UTF-16 does. */
function decode(bytes: Uint8Array): string | null {
  if (looksLikeUtf16(bytes)) return null;
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}

/** By its byte-order mark, or by a NUL beside one of the first two characters. */
function looksLikeUtf16(b: Uint8Array): boolean {
  if ((b[0] === 0xff && b[1] === 0xfe) || (b[0] === 0xfe && b[1] === 0xff)) return true;
  const little = b[1] === 0 && b[3] === 0 && b[0] !== 0 && b[2] !== 0;
  const big = b[0] === 0 && b[2] === 0 && b[1] !== 0 && b[3] !== 0;
  return b.length >= 4 && (little || big);
}

const utf8Length = (text: string): number =>
  text.length > LARGEST_BYTES || text.length * 3 <= LARGEST_BYTES
    ? text.length
    : new TextEncoder().encode(text).length;

const refuse = (found: string, allowed: string, message: string): JsonResult => ({
  ok: false,
  problems: [problem({ path: '', found, allowed, message })],
  count: 1
});
