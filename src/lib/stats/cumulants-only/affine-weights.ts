const dot = (a: number[], b: number[]): number => a.reduce((sum, x, i) => sum + x * b[i], 0);

/**
 * Weights that sum to 1, signs free, with which points add up to the vector of least norm.
 *
 * @param points a handful of vectors of one length
 * @returns null when the points are not affinely independent, up to 1e-12 of their differences
 *
 * Least squares over the differences to one point by Gram–Schmidt, each twice: with the Gram matrix the squared
 * condition would lose points that lie close together on a curve.
 */
export function affineWeights(points: number[][]): number[] | null {
  const norms = points.map((point) => dot(point, point));
  const base = norms.indexOf(Math.min(...norms));
  const others = points.map((_, i) => i).filter((i) => i !== base);
  const weights = points.map(() => 0);
  weights[base] = 1;
  if (others.length > points[0].length) return null;
  const axes: number[][] = [];
  const upper: number[][] = [];
  for (const i of others) {
    const axis = points[i].map((x, k) => x - points[base][k]);
    const length = Math.sqrt(dot(axis, axis));
    const along = axes.map(() => 0);
    for (let pass = 0; pass < 2; pass++)
      axes.forEach((before, j) => {
        const part = dot(axis, before);
        along[j] += part;
        before.forEach((x, k) => (axis[k] -= part * x));
      });
    const left = Math.sqrt(dot(axis, axis));
    if (!(left > 1e-12 * length)) return null;
    axes.push(axis.map((x) => x / left));
    upper.push([...along, left]);
  }
  const rest = [...points[base]];
  const aims = axes.map((axis) => {
    const part = dot(rest, axis);
    axis.forEach((x, k) => (rest[k] -= part * x));
    return -part;
  });
  for (let j = others.length - 1; j >= 0; j--) {
    let value = aims[j];
    for (let later = j + 1; later < others.length; later++) value -= upper[later][j] * weights[others[later]];
    weights[others[j]] = value / upper[j][j];
    weights[base] -= weights[others[j]];
  }
  return weights;
}
