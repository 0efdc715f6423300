import type { Unit } from '../types';

/** A law whose ratios of cumulants are known, counted in single defects. */
interface ReferenceRatios {
  id: string;
  /** κ2/κ1 and its error; κ3/κ1 and its error. */
  variance: [number, number];
  third: [number, number];
}

/**
 * Ratios of published laws. Landau–Zener pairs: κ2/κ1 = 1 − 1/√2, κ3/κ1 = 1 − 3/√2 + 2/√3, by the integrals of p, p²
 * and p³ over p = exp(−a k²). Kinks come in pairs, so theirs are twice and four times that. Coarsening of a chain from
 * zero temperature: simulated, 0.584 ± 0.004 and 0.146 ± 0.044, so that the two cannot be told apart by ratios.
 *
 * @param unit whether pairs or single defects were counted; coarsening is known for defects only
 */
export function referenceRatios(unit: Unit): ReferenceRatios[] {
  const second = 1 - Math.SQRT1_2;
  const third = 1 - 3 * Math.SQRT1_2 + 2 / Math.sqrt(3);
  const poisson: ReferenceRatios = { id: 'rare-events', variance: [1, 0], third: [1, 0] };
  return unit === 'pair'
    ? [{ id: 'landau-zener', variance: [second, 0], third: [third, 0] }, poisson]
    : [
        { id: 'landau-zener', variance: [2 * second, 0], third: [4 * third, 0] },
        { id: 'coarsening', variance: [0.584, 0.004], third: [0.146, 0.044] },
        poisson
      ];
}
