/** Milliseconds for other things between two parts, where a browser cannot say when it is idle. */
const PAUSE = 50;

/**
 * Lays out the parts of a page that its style sheet leaves rolled up below the window, one whenever the browser is idle,
 * so that a reader's software finds all of them soon after the page answers.
 *
 * @returns what stops it
 */
export function unroll(place: HTMLElement): () => void {
  const parts = [...place.querySelectorAll<HTMLElement>(':scope > section')];
  const idle = 'requestIdleCallback' in window;
  let waiting = 0;

  function next(): void {
    const part = parts.shift();
    if (!part) return void (place.dataset.unrolled = '');
    part.dataset.unrolled = '';
    wait();
  }
  const wait = (): void => void (waiting = idle ? requestIdleCallback(next) : window.setTimeout(next, PAUSE));

  wait();
  return () => (idle ? cancelIdleCallback(waiting) : clearTimeout(waiting));
}
