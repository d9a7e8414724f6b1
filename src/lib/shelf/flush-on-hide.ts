import type { Autosave } from './autosave';

/** Stores at once when the page is hidden or left: there may be no later. Gives back how to stop. */
export function flushOnHide(
  autosave: Pick<Autosave, 'flush'>,
  page: Pick<Document, 'addEventListener' | 'removeEventListener' | 'visibilityState'>,
  frame: Pick<Window, 'addEventListener' | 'removeEventListener'>
): () => void {
  const flush = () => void autosave.flush();
  const ifHidden = () => {
    if (page.visibilityState === 'hidden') flush();
  };
  page.addEventListener('visibilitychange', ifHidden);
  frame.addEventListener('pagehide', flush);
  return () => {
    page.removeEventListener('visibilitychange', ifHidden);
    frame.removeEventListener('pagehide', flush);
  };
}
