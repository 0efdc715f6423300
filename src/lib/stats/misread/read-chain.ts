import type { Level } from '../types';
import { chainBlocks } from './chain-blocks';
import { chainMoments } from './chain-moments';
import type { Chain } from './chain-space';
import { chainWindow } from './chain-window';
import type { Window } from '../laws/window';

/** Independent kinks along a chain, as they are read with misread sites: the law that a diagnosis fits then. Plain. */
export interface ReadChain extends Chain {
  /** ε of one site. */
  rate: number;
}

/** Whether a law is one of misread kinks. */
export function isReadChain(law: object): law is ReadChain {
  return 'rate' in law;
}

/** Its pmf; see chainWindow. */
export function readWindow(chain: ReadChain, trim = 0, scale?: number): Window {
  return chainWindow(chainBlocks(chain), chain.rate, trim, scale);
}

/** Its mean and variance. */
export function readMoments(chain: ReadChain): { mean: number; variance: number } {
  return chainMoments(chainBlocks(chain), chain.rate);
}

/**
 * P(X even) = ½(1 + u² Π(1 − 2p)^n): a flip inside the chain toggles two bonds and keeps the parity, one at either end
 * does not.
 */
export function readEven({ p, runs, rate }: ReadChain): number {
  let product = 1 - 4 * rate * (1 - rate);
  for (const { level, trials } of runs) product *= (1 - 2 * p[level]) ** trials;
  return (1 + product) / 2;
}

/** Levels of the document: from high to low, however they lie along the chain. */
export function readLevels({ p, runs }: Chain): Level[] {
  const sizes = new Map<number, number>();
  for (const { level, trials } of runs) sizes.set(p[level], (sizes.get(p[level]) ?? 0) + trials);
  return [...sizes].map(([one, trials]) => ({ p: one, trials })).sort((a, b) => b.p - a.p);
}
