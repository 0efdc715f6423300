import type { Size } from './picture';

/** Letters of a chart beside those of the page. */
const SHARE = 0.76;

/** The size at which the server draws: the page's own letters of 17 units, and the column of windows 1280 to 1500 wide. */
export const FIRST_SIZE: Size = { width: 836, text: SHARE * 17 };

/** Height of a chart's letters in this browser, units of the picture: they follow what its reader set for the page. */
export const textSize = (): number => SHARE * parseFloat(getComputedStyle(document.documentElement).fontSize);

/** Whether the server's drawing in `place` has the size that this browser would draw it at, to a hundredth. */
export function standsAsDrawn(place: Element): boolean {
  const room = place.querySelector('svg[data-readings]')?.parentElement;
  if (!room) return false;
  return (
    Math.abs(room.clientWidth / FIRST_SIZE.width - 1) < 0.01 && Math.abs(textSize() - FIRST_SIZE.text) < 0.01
  );
}
