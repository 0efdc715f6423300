import type { Frame, Mark } from './picture';

/** Names of lines to the right of the frame, each level with its end, and moved apart where two would touch. */
export function seriesLabels(ends: { text: string; y: number }[], frame: Frame, size: number): Mark[] {
  const sorted = [...ends].sort((a, b) => a.y - b.y);
  const apart = size * 1.3;
  const places: number[] = [];
  for (const { y } of sorted) places.push(Math.max(y, (places.at(-1) ?? -Infinity) + apart));
  // What was pushed below the frame pushes back.
  for (let i = places.length - 1, floor = frame.bottom; i >= 0; i--, floor = places[i + 1] - apart)
    places[i] = Math.min(places[i], floor);
  return sorted.map(({ text }, i) => ({
    kind: 'text',
    x: frame.right + 6,
    y: places[i] + size * 0.35,
    text,
    anchor: 'start',
    ink: 'ink',
    face: 'text',
    size
  }));
}
