import { bestRate } from '$lib/stats/rate-interval/best-rate';
import { chainFit } from '$lib/stats/misread/chain-fit';
import { fitData } from '$lib/stats/fit/fit-data';
import { expect, it } from 'vitest';
import { readKinks } from '../misread/read-kinks';

it('fits within 0.05 nats of the best of a grid ten times as fine, and stays within its limits', () => {
  const counts = fitData(readKinks(11, 30, 0.08, 0.02, 4000), 30);
  const [low, high] = [0, 0.04];
  const found = bestRate(counts, low, high);
  expect(found).toBeGreaterThanOrEqual(low);
  expect(found).toBeLessThanOrEqual(high);
  let best = -Infinity;
  for (let i = 0; i <= 60; i++)
    best = Math.max(best, chainFit(counts, low + ((high - low) * i) / 60, null, 1e-4).value);
  expect(chainFit(counts, found, null, 1e-4).value).toBeGreaterThan(best - 0.05);
});
