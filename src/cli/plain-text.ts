/** Text from a file, made safe for a terminal: control and direction-changing characters become spaces. */
export const plainText = (text: string): string =>
  text.replace(/[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]+/gu, ' ').trim();
