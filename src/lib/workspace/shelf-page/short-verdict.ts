/** The verdict of a plan for a list: the word that decides, and the next sentence. */
export interface ShortVerdict {
  /** "Holds." or "Does not hold.", or "Holds, but falls 2 dB short at 20 Hz." up to its comma. */
  readonly word: string;
  readonly rest: string;
}

/** A point ends a sentence where a space and a new sentence follow: "18.2 Hz" has none. */
const SENTENCES = /(?<=[.!?]) (?=[^a-z])/;
const WORD = /^(Holds|Does not hold)[.,:]?/;

export function shortVerdict(sentence: string): ShortVerdict {
  const [first, second] = sentence.split(SENTENCES);
  const word = WORD.exec(first)?.[0] ?? '';
  const begun = first.slice(word.length).trim();
  return { word, rest: begun === '' ? (second ?? '') : begun };
}
