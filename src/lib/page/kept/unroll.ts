import { unfoldNotes } from '../terms/unfold-notes';

/** Milliseconds for other things between two parts, where a browser cannot say when it is idle. */
const PAUSE = 50;

/** Milliseconds of idle time that must be left for one more piece: a slow processor takes so long for one. */
const ENOUGH = 25;

/** What the style sheet leaves rolled up: parts of the page, and what they are made of. */
const PARTS = ':scope > *';
const PIECES = ':is(.main, .main > dl) > :not(dl)';

/** The first formula alone took 40 to 55 ms at a quarter of the speed: browsers then look for a font of big signs. */
const FORMULAS = '.main > dl .term-formula';

/** What is to be done for one part, each so little that a slow processor hardly notices. */
function* stepsOf(part: HTMLElement): Generator<() => void> {
  const pieces = [...part.querySelectorAll<HTMLElement>(`${PIECES}, ${FORMULAS}`)];
  const box = part.getBoundingClientRect();
  const seen = box.top < innerHeight && box.bottom > 0;
  // What is seen is laid out: rolled up now, its margins would move.
  if (seen) for (const piece of pieces) piece.dataset.unrolled = '';
  yield () => (part.dataset.unrolled = '');
  if (!seen) for (const piece of pieces) yield () => (piece.dataset.unrolled = '');
  for (const terms of part.querySelectorAll('.terms')) yield () => unfoldNotes(terms);
}

/**
 * Lays out what a page's style sheet leaves rolled up below the window, a piece whenever the browser is idle, so that a
 * reader's software finds all of it soon after the page answers, and writes out the notes of terms. Paper gets all of it
 * at once.
 *
 * @returns what stops it
 */
export function unroll(place: HTMLElement): () => void {
  const parts = [...place.querySelectorAll<HTMLElement>(PARTS)];
  const idle = 'requestIdleCallback' in window;
  let waiting = 0;
  let steps: Iterator<() => void> | undefined;

  /** The next thing to do; undefined at the end. */
  function step(): (() => void) | undefined {
    for (;;) {
      const one = steps?.next();
      if (one && !one.done) return one.value;
      const part = parts.shift();
      if (!part) return;
      steps = stepsOf(part);
    }
  }
  function next(time?: IdleDeadline): void {
    do {
      const now = step();
      if (!now) return finish();
      now();
      // Laid out at once, so that what it took counts.
      place.getBoundingClientRect();
    } while (time && time.timeRemaining() > ENOUGH);
    wait();
  }
  function finish(): void {
    parts.length = 0;
    steps = undefined;
    for (const rolled of place.querySelectorAll<HTMLElement>(`${PARTS}, ${PIECES}, ${FORMULAS}`))
      rolled.dataset.unrolled = '';
    place.dataset.whole = '';
    unfoldNotes(place);
  }
  /** Who asks for one part by its address must find it where the browser went, which what is above may not move. */
  function aim(): void {
    const target = document.getElementById(decodeURIComponent(location.hash.slice(1)));
    if (!target || !place.contains(target)) return;
    finish();
    target.scrollIntoView();
  }
  const wait = (): void =>
    void (waiting = idle ? requestIdleCallback(next) : window.setTimeout(() => next(), PAUSE));

  const stopping = new AbortController();
  addEventListener('beforeprint', finish, { signal: stopping.signal });
  addEventListener('hashchange', () => parts.length > 0 && aim(), { signal: stopping.signal });
  if (parts.length > 0) aim();
  wait();
  return () => {
    stopping.abort();
    if (idle) cancelIdleCallback(waiting);
    else clearTimeout(waiting);
  };
}
