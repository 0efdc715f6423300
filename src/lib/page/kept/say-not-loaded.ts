const WORDS =
  'This part of the page did not load, so it does not answer. What you typed stands; load the page again when the network is back.';

/** Says once, at the end of a part, that what makes it live did not load. */
export function sayNotLoaded(place: HTMLElement): void {
  if (place.querySelector(':scope > .not-loaded')) return;
  const words = document.createElement('p');
  words.className = 'not-loaded';
  words.setAttribute('role', 'alert');
  words.textContent = WORDS;
  place.append(words);
}
