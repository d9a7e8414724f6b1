/** A value as it is, without the noise of its last bits, with a true minus sign. */
export const plainNumber = (value: number): string => String(Number(value.toPrecision(12))).replace('-', '−');
