import type { Level } from '../types';
import { chainBlocks } from './chain-blocks';
import { truncatedWindow } from '../truncation/truncated-window';
import { windowMoments } from '../truncation/window-moments';
import { chainMoments } from './chain-moments';
import type { Kept } from './chain-score';
import type { Chain } from './chain-space';
import { chainWindow } from './chain-window';
import { ringWindow } from './ring-window';
import type { Window } from '../laws/window';

/** Independent kinks along a chain, as they are read with misread sites: the law that a diagnosis fits then. Plain. */
export interface ReadChain extends Chain {
  /** ε of one site. */
  rate: number;
  /** Only these counts were kept: the law is conditioned on them. Left out: no shot was dropped. */
  kept?: Kept;
  /** The chain closes to a ring, whose even total is part of the law. Left out: it is open. */
  ring?: boolean;
}

/** Whether a law is one of misread kinks. */
export function isReadChain(law: object): law is ReadChain {
  return 'rate' in law;
}

/** Its pmf; see chainWindow and ringWindow. */
export function readWindow(chain: ReadChain, trim = 0, scale?: number): Window {
  if (chain.ring) return ringWindow(chainBlocks(chain), chain.rate, scale, trim);
  const whole = chainWindow(chainBlocks(chain), chain.rate, chain.kept ? 0 : trim, scale);
  return chain.kept ? truncatedWindow(whole, chain.kept) : whole;
}

/** Its mean and variance; on a ring without what lies under 1e-20 of the mode. */
export function readMoments(chain: ReadChain): { mean: number; variance: number } {
  return chain.kept || chain.ring
    ? windowMoments(readWindow(chain, 1e-20))
    : chainMoments(chainBlocks(chain), chain.rate);
}

/**
 * P(X even) = ½(1 + u² Π(1 − 2p)^n): a flip inside the chain toggles two bonds and keeps the parity, one at either end
 * does not. On a ring every count is even.
 */
export function readEven(chain: ReadChain): number {
  const { p, runs, rate } = chain;
  if (chain.ring) return 1;
  if (chain.kept) {
    const { first, values, scale } = readWindow(chain);
    return values.reduce((sum, f, i) => ((first + i) % 2 === 0 ? sum + f / scale : sum), 0);
  }
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
