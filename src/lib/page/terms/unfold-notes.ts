/**
 * Writes out the notes of terms that the server folded into `noscript`: a browser that runs scripts reads those as plain
 * text, and so need not build the formulas of eighty closed notes before a report can be used.
 */
export function unfoldNotes(within: Element): void {
  for (const folded of within.querySelectorAll('.terms details > noscript')) {
    const note = document.createElement('template');
    note.innerHTML = folded.textContent ?? '';
    folded.replaceWith(note.content);
  }
}
