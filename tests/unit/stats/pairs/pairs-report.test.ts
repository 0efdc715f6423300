import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { pairsReport } from '$lib/stats/pairs/pairs-report';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** Pairs on a ring of 40 bonds, p = 0.1 each of 20 places; `lost` of the shots miss one kink. */
function ring(seed: number, shots: number, lost = 0): Histogram {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (let i = 0; i < shots; i++) {
    const count = 2 * binomialSample(random, 20, 0.1);
    const read = count > 0 && random.next() < lost ? count - 1 : count;
    seen.set(read, (seen.get(read) ?? 0) + 1);
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}

const options = { ...defaultOptions, trials: 40, geometry: 'ring-bonds' as const, resamples: 999 };

describe('counts of a ring', () => {
  it('are proposed as pairs: pairing shown and not bunching; as pairs, compatible', async () => {
    const singles = await diagnose(ring(1, 4000), options);
    expect(singles.nuisances!.pairs!.proposed).toBe(true);
    expect(singles.nuisances!.pairs!.statement).toMatch(
      /^Every one of the 4.000 counts is even.*Count pairs/
    );
    const ids = singles.flags.filter(({ grade }) => grade === 'shown').map(({ id }) => id);
    expect(ids).toContain('pairing');
    expect(singles.flags.map(({ id }) => id)).not.toContain('bunching');
    const pairs = await diagnose(ring(1, 4000), { ...options, unit: 'pair' });
    expect(pairs.answer.verdict).toBe('compatible');
    expect(pairs.nuisances?.pairs).toBeUndefined();
  });

  it('with lost kinks give the rate of faults: one shot in ten misses one, if it has any', async () => {
    const found = await diagnose(ring(2, 4000, 0.1), { ...options, resamples: 99 });
    const { odd, proposed, statement } = found.nuisances!.pairs!;
    expect(proposed).toBe(false);
    // P(no defect) = 0.9^20 = 0.1216, so 8.8 % of the shots are odd.
    expect(odd!.share.low!).toBeLessThan(0.0878);
    expect(odd!.share.high!).toBeGreaterThan(0.0878);
    expect(statement).toMatch(/no ring gives.*lost sites, missed bonds/);
  });

  it('are not proposed as pairs by chance: few shots, all empty, odd N, or pairs already', () => {
    const of = (
      counts: [number, number][],
      trials: number | null,
      expected: number,
      unit: 'defect' | 'pair' = 'defect'
    ) => {
      const shots = counts.reduce((sum, [, h]) => sum + h, 0);
      const histogram: Histogram = { kind: 'histogram', counts, lump: null };
      return pairsReport(histogram, shots, { trials, unit, geometry: 'sites' }, { seen: shots, expected });
    };
    expect(
      of(
        [
          [0, 5],
          [2, 4]
        ],
        10,
        0.5
      )
    ).toBeUndefined();
    expect(of([[0, 5000]], 10, 0.9)).toBeUndefined();
    expect(
      of(
        [
          [0, 50],
          [2, 40]
        ],
        10,
        0.5
      )
    ).toMatchObject({ proposed: true });
    expect(
      of(
        [
          [0, 50],
          [2, 40]
        ],
        11,
        0.5
      )
    ).toMatchObject({
      proposed: false,
      statement: expect.stringMatching(/give one trial less/) as string
    });
    expect(
      of(
        [
          [0, 50],
          [2, 40]
        ],
        10,
        0.5,
        'pair'
      )
    ).toBeUndefined();
  });
});
