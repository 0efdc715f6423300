/** A vertical stroke from `from` to `to` at `x`, picture units; an arrow head at `to` when the end is open. */
export interface Stroke {
  x: number;
  from: number;
  to: number;
  open?: boolean;
}

const round = (value: number): number => Math.round(value * 100) / 100;

/** Path string of intervals as plain strokes; an open end carries a small arrow head. */
export function intervalPath(strokes: Stroke[]): string {
  return strokes
    .map(({ x, from, to, open }) => {
      const stroke = `M${round(x)},${round(from)}V${round(to)}`;
      if (!open) return stroke;
      const back = round(to + (to < from ? 5 : -5));
      return `${stroke}M${round(x - 3)},${back}L${round(x)},${round(to)}L${round(x + 3)},${back}`;
    })
    .join('');
}
