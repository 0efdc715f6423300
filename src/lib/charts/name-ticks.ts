import type { Tick } from './picture';

/** Letters of a name that an axis shows at most. */
const LONGEST = 10;

/**
 * Ticks of an axis whose places have names: every name where all fit, else as many as fit, evenly from the first; long names
 * are cut.
 *
 * @param at place of each, picture units, in order
 * @param room from where to where letters may reach
 * @param text height of the letters
 */
export function nameTicks(names: string[], at: number[], room: [number, number], text: number): Tick[] {
  const short = names.map((name) => {
    const letters = [...name];
    return letters.length > LONGEST ? `${letters.slice(0, LONGEST - 1).join('')}…` : name;
  });
  const half = short.map((name) => [...name].length * 0.31 * text);
  const gap = at.length > 1 ? at[1] - at[0] : Infinity;
  const every = Math.max(1, Math.ceil((2 * Math.max(...half, 0) + 0.7 * text) / gap));
  return short.flatMap((name, i) => {
    const inside = at[i] - half[i] >= room[0] && at[i] + half[i] <= room[1];
    return i % every === 0 && inside ? [{ at: at[i], text: name }] : [];
  });
}
