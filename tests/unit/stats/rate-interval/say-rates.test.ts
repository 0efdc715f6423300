import { changesOf } from '$lib/stats/rate-interval/changes-of';
import { sayRates } from '$lib/stats/rate-interval/say-rates';
import type { RateVerdict } from '$lib/stats/rate-interval/types';
import type { Verdict } from '$lib/stats/types';
import { expect, it } from 'vitest';

const at = (rate: number, verdict: Verdict): RateVerdict => ({
  rate,
  verdict,
  ceiling: 5,
  dispersion: { value: 1, low: 0.9, high: 1.1 }
});
const say = (rates: RateVerdict[], cutByCounts = false) =>
  sayRates(
    {
      uncertainty: 0.001,
      miss: 1e-4,
      low: rates[0].rate,
      high: rates[rates.length - 1].rate,
      cutByCounts,
      rates,
      changes: changesOf(rates)
    },
    0.01
  ).replaceAll('\u202f', ' ');

it('says interval, method and where the answer changes', () => {
  const text = say([
    at(0.006, 'ruled-out'),
    at(0.0085, 'ruled-out'),
    at(0.0087, 'undecided'),
    at(0.0095, 'compatible'),
    at(0.014, 'compatible')
  ]);
  expect(text).toContain('in 0.600 % to 1.40 % of readings');
  expect(text).toContain('Berger and Boos 1994');
  expect(text).toMatch(
    /At rates up to 0\.850 % independent trials are ruled out; at 0\.870 % the counts cannot tell; from 0\.950 % on the counts are compatible/
  );
});

it('gives close ends another digit, so that they do not read alike', () => {
  expect(say([at(0.009, 'ruled-out'), at(0.010012, 'ruled-out'), at(0.010034, 'compatible')])).toMatch(
    /up to 1\.001 % .* from 1\.003 % on/
  );
});

it('says that the answer holds throughout, and where the counts cut the interval', () => {
  const text = say([at(0.006, 'compatible'), at(0.014, 'compatible')], true);
  expect(text).toContain('where a larger rate would show more than was read');
  expect(text).toContain('At every rate tried the counts are compatible with independent trials.');
});
