/** Takes back what first-reading.ts put into a place, so that its chart is as the server drew it. */
export function endFirstReading(place: Element): void {
  for (const mark of place.querySelectorAll('[data-first-reading]')) mark.remove();
  for (const keys of place.querySelectorAll('.keys')) keys.classList.remove('sr-only');
}
