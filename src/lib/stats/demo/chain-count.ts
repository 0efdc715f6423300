import type { Generator } from '../random/generator';

/**
 * Defects along a two-state Markov chain that keeps the probability p at every site: neighbours are correlated
 * by `correlation`, sites d apart by its d-th power, so variance over ceiling is near (1 + c)/(1 − c) for long
 * chains.
 */
export function chainCount(random: Generator, sites: number, p: number, correlation: number): number {
  let defect = random.next() < p;
  let count = defect ? 1 : 0;
  for (let site = 1; site < sites; site++) {
    defect = random.next() < p * (1 - correlation) + (defect ? correlation : 0);
    if (defect) count++;
  }
  return count;
}
