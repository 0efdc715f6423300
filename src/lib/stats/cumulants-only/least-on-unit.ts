import { findRoot } from '../numerics/find-root';

/**
 * Where a polynomial of degree four or less is least on [0, 1], exactly: the roots of its second derivative part the
 * interval into stretches on which the first has at most one root.
 *
 * @param a coefficients a0 … a4, lowest power first
 */
export function leastOnUnit([a0, a1, a2, a3, a4]: number[]): number {
  const slope = (x: number) => a1 + x * (2 * a2 + x * (3 * a3 + x * 4 * a4));
  const value = (x: number) => a0 + x * (a1 + x * (a2 + x * (a3 + x * a4)));
  const edges = [0, ...turns(12 * a4, 6 * a3, 2 * a2), 1];
  const candidates = [...edges];
  for (let i = 1; i < edges.length; i++) {
    const root = findRoot(slope, edges[i - 1], edges[i]);
    if (Number.isFinite(root)) candidates.push(root);
  }
  return candidates.reduce((best, x) => (value(x) < value(best) ? x : best));
}

/** Roots of a x² + b x + c inside (0, 1), ascending; by the form that loses no digits. */
function turns(a: number, b: number, c: number): number[] {
  const inner = b * b - 4 * a * c;
  if (!(inner >= 0)) return [];
  const q = -(b + (b < 0 ? -1 : 1) * Math.sqrt(inner)) / 2;
  return [q / a, c / q].filter((x) => x > 0 && x < 1).sort((x, y) => x - y);
}
