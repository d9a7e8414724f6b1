/** A sentence with some of its words set apart: what is over, and what is within limits. */
export interface Phrase {
  readonly text: string;
  readonly tone?: 'over' | 'within';
}

export const say = (text: string): Phrase => ({ text });
export const over = (text: string): Phrase => ({ text, tone: 'over' });
export const within = (text: string): Phrase => ({ text, tone: 'within' });

/** Sentences one after another; empty ones are left out. */
export const sentences = (...all: readonly (readonly Phrase[])[]): Phrase[] =>
  all.filter((one) => one.length > 0).flatMap((one, i) => (i === 0 ? one : [say(' '), ...one]));

/** The words alone. */
export const plainText = (phrases: readonly Phrase[]): string => phrases.map(({ text }) => text).join('');

/** A number and its unit kept on one line. */
export const unbroken = (text: string): string =>
  text
    .replace(/(\d) (?=(?:L|cu ft|Hz|dB|dBV|W|V|A|mm|in|ohm)\b)/g, '$1\u00a0')
    .replaceAll('cu ft', 'cu\u00a0ft');
