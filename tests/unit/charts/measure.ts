import type { TextMark } from '$lib/charts/picture';

/** All x and y of a path of M, L, H, V, v, A and Z: what d3 and these charts write. */
export function coordinates(d: string): { x: number[]; y: number[] } {
  const x: number[] = [];
  const y: number[] = [];
  for (const [, command, list] of d.matchAll(/([MLHVAvZ])([^MLHVAvZ]*)/g)) {
    const numbers = list.split(/[ ,]/).filter(Boolean).map(Number);
    if (command === 'v') continue;
    if (command === 'H') x.push(numbers[0]);
    else if (command === 'V') y.push(numbers[0]);
    else if (command !== 'Z') {
      x.push(numbers[numbers.length - 2]);
      y.push(numbers[numbers.length - 1]);
    }
  }
  return { x, y };
}

/** About where a text begins and ends: the faces run to about 0.5 and 0.6 of their size a letter. */
export function extent({ x, anchor, text, raised = '', size, face }: TextMark): [number, number] {
  const length = (text.length + 0.75 * raised.length) * size * (face === 'number' ? 0.6 : 0.5);
  const start = anchor === 'start' ? x : anchor === 'end' ? x - length : x - length / 2;
  return [start, start + length];
}
