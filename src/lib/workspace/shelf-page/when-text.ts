/**
 * When a plan was changed, in the words of the page whatever the device's language, by the device's clock and calendar:
 * "today 14:02", "yesterday 09:15", "12 Nov", "12 Nov 2024".
 */
const LANGUAGE = 'en-GB';
const TIME = new Intl.DateTimeFormat(LANGUAGE, { hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });
const DATE = new Intl.DateTimeFormat(LANGUAGE, { day: 'numeric', month: 'short' });
const WITH_YEAR = new Intl.DateTimeFormat(LANGUAGE, { day: 'numeric', month: 'short', year: 'numeric' });
const IN_FULL = new Intl.DateTimeFormat(LANGUAGE, {
  dateStyle: 'long',
  timeStyle: 'short',
  hourCycle: 'h23'
});

/** `at` and `now` in ms since 1970. */
export function whenText(at: number, now: number): string {
  const [then, today] = [new Date(at), new Date(now)];
  if (isSameDay(then, today)) return `today ${TIME.format(then)}`;
  const yesterday = new Date(today.getFullYear(), today.getMonth(), today.getDate() - 1);
  if (isSameDay(then, yesterday)) return `yesterday ${TIME.format(then)}`;
  return (then.getFullYear() === today.getFullYear() ? DATE : WITH_YEAR).format(then);
}

/** The same to the minute: "12 November 2025 at 14:02". */
export const whenInFull = (at: number): string => IN_FULL.format(new Date(at));

const isSameDay = (a: Date, b: Date): boolean =>
  a.getFullYear() === b.getFullYear() && a.getMonth() === b.getMonth() && a.getDate() === b.getDate();
