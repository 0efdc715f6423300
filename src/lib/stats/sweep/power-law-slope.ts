/** χ² of power laws at one place of their parameters, and which way is down. */
export interface PowerLawSlope {
  chiSquare: number;
  /** Half of the downhill gradient, JᵀW(y − law). */
  gradient: Float64Array;
  /** JᵀWJ, row by row. */
  normal: Float64Array;
}

/**
 * χ² = Σ (y − law)ᵀ W (y − law) over the points, law_q = exp(c_q − b_q x), with half its downhill gradient and the
 * normal matrix of Gauss and Newton. A sweep of 100 datasets asks for this some thousand times, over and over the same
 * points: hence plain loops over flat arrays.
 *
 * @param place c of each quantity, then b: one for each quantity, or one for all
 * @param x ln τ less the middle, a point each
 * @param values and `weights`: of each point its quantities, and the inverse of their covariance row by row
 */
export function powerLawSlope(
  place: ArrayLike<number>,
  x: number[],
  values: number[][],
  weights: number[][]
): PowerLawSlope {
  const size = values[0].length;
  const parameters = place.length;
  const tied = parameters === size + 1;
  const gradient = new Float64Array(parameters);
  const normal = new Float64Array(parameters * parameters);
  const law = new Float64Array(size);
  const off = new Float64Array(size);
  let chiSquare = 0;
  for (let i = 0; i < x.length; i++) {
    const weight = weights[i];
    for (let q = 0; q < size; q++) {
      law[q] = Math.exp(place[q] - place[tied ? size : size + q] * x[i]);
      off[q] = values[i][q] - law[q];
    }
    for (let q = 0; q < size; q++) {
      const slope = tied ? size : size + q;
      let pulled = 0;
      for (let r = 0; r < size; r++) pulled += weight[q * size + r] * off[r];
      chiSquare += off[q] * pulled;
      gradient[q] += law[q] * pulled;
      gradient[slope] -= x[i] * law[q] * pulled;
      for (let r = 0; r < size; r++) {
        const other = tied ? size : size + r;
        const both = law[q] * weight[q * size + r] * law[r];
        normal[q * parameters + r] += both;
        normal[q * parameters + other] -= x[i] * both;
        normal[slope * parameters + r] -= x[i] * both;
        normal[slope * parameters + other] += x[i] * x[i] * both;
      }
    }
  }
  return { chiSquare, gradient, normal };
}
