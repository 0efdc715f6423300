/** Distance of the path from the pole at 0, in units of 1/σ. */
const offset = 3;
/** Spacing of the nodes in the same unit: the rule errs by e^{−2π·offset/spacing} = 4e-17. */
const spacing = 0.5;
const nodes = 20;

/**
 * P(X ≥ k) near the mean of a binomial or Poisson count of large variance.
 *
 * @param excess k − mean, best within −0.5 … 3 standard deviations
 * @param variance V ≥ 1000
 * @param skew 1 − 2p for a binomial, 1 for a Poisson count; change the sign of it and of `excess` for the
 *   lower tail
 * @param spread p(1−p) for a binomial, 0 for a Poisson count
 * @returns relative error about 1e-14 for every V up to the largest doubles
 *
 * P(X ≥ k) = (1/2πi) ∫ e^{K(s) − ks} / (1 − e^{−s}) ds along Re s = 3/σ, by the trapezoidal rule, which
 * converges exponentially there. K(s) − s·mean = V Σ h_j s^{j+1}/(j+1) has h₁ = 1 and
 * (j+1) h_{j+1} = skew·h_j − spread·Σ h_i h_{j−i}, from the logistic equation of K′. Taking the mean out first
 * is what keeps digits when V is 1e15. The path leaves out |Im s| > 10/σ, where the integrand is below e^{−50}.
 * A continued fraction needs about 170/z² steps z standard deviations out, a sum about 7σ terms: neither does
 * at the mean.
 * Sources: Daniels 1987, Tail probability approximations; Trefethen & Weideman 2014, SIAM Review 56:385.
 */
export function centralTail(excess: number, variance: number, skew: number, spread: number): number {
  const sigma = Math.sqrt(variance);
  const coefficients = cumulantSeries(sigma, skew, spread);
  const re = offset / sigma;
  let sum = 0;
  for (let node = 0; node <= nodes; node++) {
    const im = (node * spacing) / sigma;
    // Horner in s; the series starts at s², which is taken out.
    let seriesRe = 0;
    let seriesIm = 0;
    for (let j = coefficients.length - 1; j >= 0; j--) {
      const product = seriesRe * re - seriesIm * im + coefficients[j];
      seriesIm = seriesRe * im + seriesIm * re;
      seriesRe = product;
    }
    const squareRe = re * re - im * im;
    const squareIm = 2 * re * im;
    const exponent = variance * (squareRe * seriesRe - squareIm * seriesIm) - excess * re;
    const phase = variance * (squareRe * seriesIm + squareIm * seriesRe) - excess * im;
    const [weightRe, weightIm] = lattice(re, im, squareRe, squareIm);
    const value = Math.exp(exponent) * (weightRe * Math.cos(phase) - weightIm * Math.sin(phase));
    sum += node === 0 ? value / 2 : value;
  }
  return (sum * spacing) / (Math.PI * sigma);
}

/** h_j/(j+1), j = 1, 2, …, as many as |s| ≤ 10/σ needs; the series converges for |s| < π at least. */
function cumulantSeries(sigma: number, skew: number, spread: number): number[] {
  const terms = Math.ceil(37 / Math.log((Math.PI * sigma) / 10));
  const h = [0, 1];
  for (let j = 1; j < terms; j++) {
    let products = 0;
    for (let i = 1; i < j; i++) products += h[i] * h[j - i];
    h.push((skew * h[j] - spread * products) / (j + 1));
  }
  return h.slice(1).map((value, j) => value / (j + 2));
}

/** 1/(1 − e^{−s}) = 1/s + ½ + s/12 − s³/720 + s⁵/30240 − s⁷/1209600 + …, |s| < 0.35. */
function lattice(re: number, im: number, squareRe: number, squareIm: number): [number, number] {
  let evenRe = 0;
  let evenIm = 0;
  for (const coefficient of [1 / 47900160, -1 / 1209600, 1 / 30240, -1 / 720, 1 / 12]) {
    const product = evenRe * squareRe - evenIm * squareIm + coefficient;
    evenIm = evenRe * squareIm + evenIm * squareRe;
    evenRe = product;
  }
  const modulus = re * re + im * im;
  return [re / modulus + 0.5 + evenRe * re - evenIm * im, -im / modulus + evenRe * im + evenIm * re];
}
