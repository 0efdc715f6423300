import { printedTable, tableTruths } from '$lib/stats/calibration/printed-tables';
import { tryTables } from '$lib/stats/calibration/try-tables';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

const truth = (start: string) => tableTruths.find(({ id }) => id.startsWith(start))!;
const asked = { shots: 2000, order: 3, repeats: 120, seed: 5 };

describe('printed tables of known causes', () => {
  it.each(tableTruths.map((one) => [one.id, one] as const))(
    'of %s have the variance that is said of them',
    (_id, one) => {
      const { mean, variance } = printedTable(one, generator(3, 0), 40_000, one.trials, 2);
      const dispersion = variance.value / (mean.value * (1 - mean.value / one.trials));
      // Its sd is √(2/40 000) = 0.007 or so, times the dispersion.
      expect(Math.abs(dispersion - one.dispersion)).toBeLessThan(0.035 * one.dispersion);
    }
  );

  it('have errors by jackknife near those of the plain formula', () => {
    const { mean, variance } = printedTable(truth('20 equal'), generator(4, 0), 20_000, 20, 2);
    // Var k1 = κ2/S, Var k2 = κ4/S + 2κ2²/(S − 1), κ2 = 3.2, κ4 = 3.2(1 − 6·0.16) = 0.128; 20 blocks: to a sixth or so.
    expect(mean.error / Math.sqrt(3.2 / 20_000)).toBeGreaterThan(0.5);
    expect(mean.error / Math.sqrt(3.2 / 20_000)).toBeLessThan(1.6);
    const plain = Math.sqrt((0.128 + 2 * 3.2 ** 2) / 20_000);
    expect(variance.error / plain).toBeGreaterThan(0.5);
    expect(variance.error / plain).toBeLessThan(1.6);
  });

  it('raise few false alarms, and a fifth of excess is seen', () => {
    for (const one of tableTruths.filter(({ dispersion }) => dispersion <= 1))
      // 5 % promised; 12 or more of 120 would come by chance in one of 60 at exactly 5 %.
      expect(tryTables(one, { ...asked, trials: one.trials }).alarms.hits, one.id).toBeLessThan(12);
    expect(tryTables(truth('20 trials, excess 20'), { ...asked, trials: 20 }).alarms.share).toBeGreaterThan(
      0.9
    );
    expect(tryTables(truth('20 trials, excess 20'), { ...asked, trials: null }).alarms.share).toBeLessThan(
      0.1
    );
  });
});
