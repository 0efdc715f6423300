/** ln(1 + p(e^θ − 1)) for p ≤ ½; beyond θ = 700 the exponential would overflow. */
export function logShift(p: number, theta: number): number {
  if (p <= 0) return 0;
  return theta > 700 ? theta + Math.log(p) : Math.log1p(p * Math.expm1(theta));
}
