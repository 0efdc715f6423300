import type { TermId } from '$lib/model/terms/terms';
import { closeTermOnEscape, openTerm } from '../terms/open-term';
import { unfoldNotes } from '../terms/unfold-notes';

/**
 * Answers what a page without components of its own is asked: words that open their notes, Escape that closes them, and
 * printing.
 *
 * @returns what stops it
 */
export function asksOfStill(place: HTMLElement): () => void {
  const stopping = new AbortController();
  const { signal } = stopping;
  place.addEventListener(
    'click',
    (event) => {
      const on = event.target as Element;
      if (on.closest('[data-ask="print"]')) print();
      const word = on.closest<HTMLAnchorElement>('a[data-term]');
      if (!word || event.defaultPrevented || event.ctrlKey || event.metaKey || event.shiftKey) return;
      if (openTerm(word.dataset.term as TermId, word)) event.preventDefault();
    },
    { signal }
  );
  place.addEventListener('keydown', closeTermOnEscape, { signal });
  // Of a fold that was just opened; the event does not rise.
  place.addEventListener('toggle', ({ target }) => unfoldNotes((target as Element).parentElement!), {
    signal,
    capture: true
  });
  return () => stopping.abort();
}
