/** File names from titles: safe on every system, whatever the title holds. */

export const EXTENSION = '.sealwright.json';

/** Bytes of UTF-8; with the extension and a number behind it a name stays under the 255 that file systems allow. */
const LONGEST = 180;

/** Names of devices, which one system keeps for itself whatever the extension. From memory. */
const RESERVED = /^(con|prn|aux|nul|com\d|lpt\d)$/;

/** "Loft corner" is loft-corner.sealwright.json. Letters and digits of any script stay, all else is a hyphen. */
export const fileName = (title: string): string => `${stem(title)}${EXTENSION}`;

/** A name for each title in order, no two alike on a system that takes upper for lower case. */
export function fileNames(titles: readonly string[]): string[] {
  const taken = new Set<string>();
  return titles.map((title) => {
    const base = stem(title);
    for (let n = 1; ; n++) {
      const name = `${n === 1 ? base : `${base}-${n}`}${EXTENSION}`;
      if (taken.has(name)) continue;
      taken.add(name);
      return name;
    }
  });
}

function stem(title: string): string {
  const words = title
    .toLowerCase()
    .normalize('NFC')
    .replace(/[^\p{L}\p{N}\p{M}]+/gu, '-');
  const name = shorten(words.replace(/^-+/, '')).replace(/-+$/, '');
  if (name === '') return 'untitled-plan';
  return RESERVED.test(name) ? `plan-${name}` : name;
}

/** Cut between characters, never inside one. */
function shorten(text: string): string {
  const encoder = new TextEncoder();
  let bytes = 0;
  let kept = '';
  for (const character of text) {
    bytes += encoder.encode(character).length;
    if (bytes > LONGEST) break;
    kept += character;
  }
  return kept;
}
