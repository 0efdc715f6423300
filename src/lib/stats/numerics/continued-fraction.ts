/** One step of a continued fraction: its numerator α and the denominator term β that follows. */
export interface FractionTerm {
  numerator: number;
  denominator: number;
}

/**
 * 1 / (β₀ + α₁/(β₁ + α₂/(β₂ + …))) with β₀ > 0, α ≥ 0 and β > 0.
 *
 * @param first β₀
 * @param term writes α_j and β_j, j = 1, 2, …, into the object it is handed: one object for all steps, since
 *   this is the innermost loop of every tail
 * @returns relative error about 1e-15; NaN if 20 000 steps do not suffice, which the tails here never need.
 *
 * Source: Lentz 1976 as modified by Thompson & Barnett 1986.
 */
export function continuedFraction(first: number, term: (j: number, into: FractionTerm) => void): number {
  const step: FractionTerm = { numerator: 0, denominator: 0 };
  let ahead = first;
  let behind = 0;
  let value = 1 / first;
  for (let j = 1; j < 20_000; j++) {
    term(j, step);
    if (step.numerator === 0) return value;
    behind = 1 / (step.denominator + step.numerator * behind);
    ahead = step.denominator + step.numerator / ahead;
    const factor = ahead * behind;
    value /= factor;
    if (Math.abs(factor - 1) < 4e-16) return value;
  }
  return NaN;
}
