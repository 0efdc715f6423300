import { unfoldNotes } from '../terms/unfold-notes';

/** Milliseconds for other things between two parts, where a browser cannot say when it is idle. */
const PAUSE = 50;

/**
 * Lays out the parts of a page that its style sheet leaves rolled up below the window, one whenever the browser is idle,
 * so that a reader's software finds all of them soon after the page answers; then writes out the notes of terms. Paper
 * gets all of it at once.
 *
 * @returns what stops it
 */
export function unroll(place: HTMLElement): () => void {
  const parts = [...place.querySelectorAll<HTMLElement>(':scope > section')];
  const idle = 'requestIdleCallback' in window;
  let waiting = 0;

  function next(): void {
    const part = parts.shift();
    if (!part) return finish();
    part.dataset.unrolled = '';
    unfoldNotes(part);
    wait();
  }
  function finish(): void {
    place.dataset.unrolled = '';
    unfoldNotes(place);
  }
  const wait = (): void => void (waiting = idle ? requestIdleCallback(next) : window.setTimeout(next, PAUSE));

  const stopping = new AbortController();
  addEventListener('beforeprint', finish, { signal: stopping.signal });
  wait();
  return () => {
    stopping.abort();
    if (idle) cancelIdleCallback(waiting);
    else clearTimeout(waiting);
  };
}
