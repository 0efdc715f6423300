/** An address such as `#remarks-law`, as mail gives it, opens the fold it names. */
export function openAtHash(): void {
  const fold = document.getElementById(location.hash.slice(1));
  if (!(fold instanceof HTMLDetailsElement)) return;
  fold.open = true;
  fold.scrollIntoView();
}
