/** ms until the address of an offered file is given up; browsers may fetch it some time after the click. From memory: a few seconds do. */
export const REVOKE_AFTER = 10_000;

/** Offers a text or bytes to be saved under a name. */
export function exportFile(name: string, content: string | Uint8Array<ArrayBuffer>): void {
  const type = typeof content === 'string' ? 'application/json' : 'application/zip';
  const address = URL.createObjectURL(new Blob([content], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  // Some browsers follow only links that are part of the page.
  link.hidden = true;
  document.body.append(link);
  link.click();
  link.remove();
  setTimeout(() => URL.revokeObjectURL(address), REVOKE_AFTER);
}
