import { changesOf } from '$lib/stats/rate-interval/changes-of';
import type { RateVerdict } from '$lib/stats/rate-interval/types';
import type { Verdict } from '$lib/stats/types';
import { expect, it } from 'vitest';

const at = (rate: number, verdict: Verdict): RateVerdict => ({
  rate,
  verdict,
  ceiling: 5,
  dispersion: { value: 1, low: 0.9, high: 1.1 }
});

it('finds each pair of neighbours with other answers', () => {
  expect(
    changesOf([at(0, 'ruled-out'), at(0.01, 'ruled-out'), at(0.02, 'undecided'), at(0.03, 'compatible')])
  ).toEqual([
    { above: 0.01, below: 0.02, from: 'ruled-out', to: 'undecided' },
    { above: 0.02, below: 0.03, from: 'undecided', to: 'compatible' }
  ]);
  expect(changesOf([at(0, 'compatible'), at(0.01, 'compatible')])).toEqual([]);
});
