import { lawWindow } from '$lib/stats/laws/law-window';
import { chainWindow } from '$lib/stats/misread/chain-window';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { everyReading } from './every-reading';

const one = (p: number) => ({ p, trials: 1 });
const probability = fc.double({ min: 0, max: 1, noNaN: true });

function pmf(p: number[], rate: number): number[] {
  const { first, values, scale } = chainWindow(p.map(one), rate);
  return Array.from({ length: p.length + 1 }, (_, n) => (values[n - first] ?? 0) / scale);
}

describe('chainWindow', () => {
  it('agrees with counting every chain and every reading, N ≤ 8', () => {
    for (const [p, rate] of [
      [[0.1, 0.5, 0.03, 0.8, 0.2, 0.9, 0.05, 0.3], 0.07],
      [[0.05, 0.05, 0.05, 0.05, 0.05, 0.05, 0.05, 0.05], 0.01],
      [[0, 1, 0.5, 0.25, 0, 0.1], 0.3],
      [[0.4], 0.2]
    ] as [number[], number][]) {
      const want = everyReading(p, rate);
      pmf(p, rate).forEach((f, n) => expect(Math.abs(f / want[n] - 1), `n = ${n}`).toBeLessThan(1e-12));
    }
  });

  it('agrees with counting for any few bonds', () => {
    fc.assert(
      fc.property(fc.array(probability, { minLength: 1, maxLength: 5 }), probability, (p, rate) => {
        const want = everyReading(p, rate);
        pmf(p, rate).forEach((f, n) => expect(Math.abs(f - want[n])).toBeLessThan(1e-14));
      }),
      { numRuns: 60 }
    );
  });

  it('is the plain law without misreads, down to 1e-300', () => {
    const levels = [
      { p: 0.31, trials: 40 },
      { p: 0.02, trials: 160 }
    ];
    const plain = lawWindow({ levels, poissonPart: 0 });
    const { first, values, scale } = chainWindow(levels, 0);
    let compared = 0;
    plain.values.forEach((value, i) => {
      if (value / plain.scale < 1e-300) return;
      compared++;
      expect(Math.abs(values[i + plain.first - first] / scale / (value / plain.scale) - 1)).toBeLessThan(
        1e-11
      );
    });
    expect(compared).toBeGreaterThan(120);
  });

  it('keeps its digits in the far tail: every bond read, with no kink possible', () => {
    // Without kinks all 300 bonds are read only where flips alternate: ε^150 (1−ε)^151 + ε^151 (1−ε)^150 = (ε(1−ε))^150.
    const rate = 0.012;
    const { first, values, scale } = chainWindow([{ p: 0, trials: 300 }], rate);
    const log = Math.log(values[300 - first]) - Math.log(scale);
    expect(Math.abs(log / (150 * Math.log(rate * (1 - rate))) - 1)).toBeLessThan(1e-14);
    expect(log).toBeLessThan(-660);
  });

  it('trims only what is small', () => {
    const blocks = [{ p: 0.1, trials: 100 }];
    const whole = chainWindow(blocks, 0.01, 0, 1);
    const short = chainWindow(blocks, 0.01, 1e-18, 1);
    expect(short.values.length).toBeLessThan(70);
    expect(short.values.length).toBeGreaterThan(35);
    short.values.forEach((f, i) =>
      expect(Math.abs(f - whole.values[i + short.first - whole.first])).toBeLessThan(1e-16)
    );
  });
});
