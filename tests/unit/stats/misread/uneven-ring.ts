/**
 * Mean and variance of the kinks read round a ring of any bonds, from the correlations of ±1 bonds given an even total:
 * E Π_{A} s = (Π_A m + Π_{not A} m)/(1 + Π m). Straight from the definition, a product for each pair.
 */
export function unevenRing(p: readonly number[], rate: number): { mean: number; variance: number } {
  const bonds = p.length;
  const m = p.map((one) => 1 - 2 * one);
  const square = (1 - 2 * rate) ** 2;
  const even = 1 + m.reduce((all, one) => all * one, 1);
  const given = (chosen: number[]) =>
    (m.reduce((all, one, k) => (chosen.includes(k) ? all * one : all), 1) +
      m.reduce((all, one, k) => (chosen.includes(k) ? all : all * one), 1)) /
    even;
  let first = 0;
  let second = 0;
  for (let j = 0; j < bonds; j++) {
    first += square * given([j]);
    for (let k = 0; k < bonds; k++) {
      const apart = Math.min((j - k + bonds) % bonds, (k - j + bonds) % bonds);
      second += apart === 0 ? 1 : given([j, k]) * (apart === 1 ? square : square * square);
    }
  }
  return { mean: (bonds - first) / 2, variance: (second - first * first) / 4 };
}
