import { readFileSync } from 'node:fs';

export interface ExactCase {
  name: string;
  p: number[];
  poissonPart: number;
  /** f_n, or ["ln", ln f_n] where it is below 1e-300. */
  pmf: (number | ['ln', number])[];
}

export interface PackageCase {
  kind: string;
  trials: number;
  p: number[];
  /** null where the value is below 1e-300. */
  pmf: (number | null)[];
  cdf: (number | null)[];
  /** P(X > n). */
  above: (number | null)[];
}

/** Exact rational values: fixtures/reference/pmf_exact.py. */
export const exactCases = read<ExactCase>('pmf_exact.json');
/** R's PoissonBinomial: fixtures/reference/poisson_binomial.R. */
export const packageCases = read<PackageCase>('poisson_binomial.json');

function read<T>(file: string): T[] {
  const text = readFileSync(new URL(`../../../../fixtures/reference/${file}`, import.meta.url), 'utf8');
  return (JSON.parse(text) as { cases: T[] }).cases;
}
