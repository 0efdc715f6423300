import { reachableThird } from '$lib/stats/bounds/reachable-third';

/** The edges of the region of independent trials: κ2/κ1 in equal steps with the lowest and highest κ3/κ1 at each. */
export function regionEdges(share: number, steps: number): [fano: number, low: number, high: number][] {
  return Array.from({ length: steps + 1 }, (_, i): [number, number, number] => {
    const fano = ((1 - share) * i) / steps;
    const edges = reachableThird(fano, share) ?? { low: NaN, high: NaN };
    return [fano, edges.low, edges.high];
  });
}
