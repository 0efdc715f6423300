import { chainSpace } from '$lib/stats/misread/chain-space';
import { ringSlopes } from '$lib/stats/misread/ring-slopes';
import { describe, expect, it } from 'vitest';
import { everyReading } from './every-reading';

/** Levels of each bond in order, and runs that say the same. */
const chains = [
  { p: [0.2], order: [0, 0, 0] },
  { p: [0.05, 0.6], order: [0, 0, 1, 1, 1] },
  { p: [0.1, 0.7, 0.35], order: [2, 0, 0, 1, 0, 2, 2] },
  { p: [0.02, 0.3], order: [1, 0, 0, 0, 0, 0, 0, 1] }
];

describe('ringSlopes', () => {
  for (const { p, order } of chains) {
    const runs = order.map((level) => ({ level, trials: 1 }));
    const bonds = order.length;
    for (const rate of [0, 0.02, 0.2]) {
      it(`gives the law and its slopes as counting every reading does: ${bonds} bonds, ε = ${rate}`, () => {
        const law = (at: number[]) =>
          everyReading(
            order.map((level) => at[level]),
            rate,
            true
          );
        const space = chainSpace(bonds, 3);
        ringSlopes(space, { p, runs }, rate, 0);
        law(p).forEach((want, n) => expect(Math.abs(space.f[n] + space.g[n] - want)).toBeLessThan(1e-13));
        p.forEach((_, j) => {
          // Differences of a smooth law over 2e-5: error about 1e-10, and 1e-11 of rounding.
          const moved = (by: number) => law(p.map((one, k) => (k === j ? one + by : one)));
          const [up, down] = [moved(1e-5), moved(-1e-5)];
          for (let n = 0; n <= bonds; n++) {
            const slope = (up[n] - down[n]) / 2e-5;
            expect(Math.abs(space.df[j][n] + space.dg[j][n] - slope)).toBeLessThan(1e-8);
          }
        });
      });
    }
  }

  it('leaves counts beyond the last one asked for out and gives the others as before', () => {
    const chain = { p: [0.1], runs: [{ level: 0, trials: 40 }] };
    const [whole, short] = [chainSpace(40, 1), chainSpace(40, 1)];
    ringSlopes(whole, chain, 0.01, 0);
    ringSlopes(short, chain, 0.01, 0, 5);
    for (let n = 0; n <= 5; n++) {
      expect(Math.abs(short.f[n] - whole.f[n])).toBeLessThan(1e-15);
      expect(Math.abs(short.df[0][n] - whole.df[0][n])).toBeLessThan(1e-13);
    }
    expect(short.high).toBe(5);
    expect(whole.high).toBe(40);
  });
});
