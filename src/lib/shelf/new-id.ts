/** 128 random bits as text; works outside secure contexts too, where `crypto.randomUUID` is missing. */
export const newId = (): string =>
  [...crypto.getRandomValues(new Uint8Array(16))].map((byte) => byte.toString(16).padStart(2, '0')).join('');
