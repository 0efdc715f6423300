import type { TermId } from '$lib/model/terms/terms';
import { unfoldNotes } from './unfold-notes';

/** Where the focus goes back to when a note that was opened from elsewhere is closed. */
const openers = new WeakMap<HTMLDetailsElement, HTMLElement>();

const foldOf = (id: TermId): HTMLDetailsElement | null =>
  document.querySelector(`details[data-note="${id}"]`);

/**
 * Opens the note of a term on this page and puts the focus on its name.
 * @returns false when this page has no such note
 */
export function openTerm(id: TermId, from: HTMLElement): boolean {
  const fold = foldOf(id);
  if (!fold) return false;
  unfoldNotes(fold.parentElement!);
  fold.open = true;
  openers.set(fold, from);
  const name = fold.querySelector('summary');
  name?.focus({ preventScroll: true });
  fold.scrollIntoView({ block: 'nearest' });
  return true;
}

/** Closes a note and gives the focus back to what opened it, or to its own name. */
function closeTerm(fold: HTMLDetailsElement): void {
  fold.open = false;
  const from = openers.get(fold);
  openers.delete(fold);
  const back = from?.isConnected ? from : fold.querySelector('summary');
  back?.focus();
}

/** For Escape pressed on the name of an open note of Terms. */
export function closeTermOnEscape(event: KeyboardEvent): void {
  const fold = (event.target as Element).closest('.terms-place summary')?.closest('details');
  if (event.key !== 'Escape' || !fold?.open) return;
  event.stopPropagation();
  closeTerm(fold);
}
