import type { Picture, TextMark } from '$lib/charts/picture';
import { coordinates, extent } from './measure';

/** Whether two labels touch: letters reach about 0.7 of their size above the line, and next to nothing below. */
function overlap(one: TextMark, other: TextMark): boolean {
  const [a, b] = [extent(one), extent(other)];
  if (a[1] <= b[0] || b[1] <= a[0]) return false;
  return one.y - 0.7 * one.size < other.y && other.y - 0.7 * other.size < one.y;
}

/** What is wrong with a picture: numbers that are none, or marks outside it. A point may reach 7 units over. */
export function faults({ width, height, marks, readings }: Picture): string[] {
  const list: string[] = [];
  const look = (what: string, value: number, limit: number) => {
    if (!Number.isFinite(value)) list.push(`${what} is ${value}`);
    else if (value < -7 || value > limit + 7) list.push(`${what} at ${value} of ${limit}`);
  };
  for (const mark of marks) {
    if (mark.kind === 'text') {
      look(`x of “${mark.text}”`, mark.x, width);
      look(`y of “${mark.text}”`, mark.y, height);
      if (/NaN|undefined|null|Infinity/.test(mark.text)) list.push(`text “${mark.text}”`);
      const [start, end] = extent(mark);
      if (start < -1 || end > width + 1) list.push(`“${mark.text}” from ${start} to ${end} of ${width}`);
      continue;
    }
    if (/NaN|Infinity|undefined|null/.test(mark.d)) list.push(`${mark.role}: ${mark.d.slice(0, 80)}`);
    const { x, y } = coordinates(mark.d);
    for (const value of x) look(`${mark.role} x`, value, width);
    for (const value of y) look(`${mark.role} y`, value, height);
  }
  const texts = marks.filter((mark) => mark.kind === 'text');
  texts.forEach((one, i) => {
    for (const other of texts.slice(i + 1))
      if (overlap(one, other)) list.push(`“${one.text}” over “${other.text}”`);
  });
  for (const { x, y, words } of readings) {
    look('reading x', x, width);
    look('reading y', y, height);
    if (/NaN|undefined|null|Infinity/.test(words())) list.push(words());
  }
  return [...new Set(list)];
}
