import { nuisances } from '$lib/stats/calibration/nuisances';
import { shiftForExcess } from '$lib/stats/calibration/shift-for-excess';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { generator } from '$lib/stats/random/generator';
import { keptEqual } from '$lib/stats/truncation/kept-equal';
import { keptShape } from '$lib/stats/truncation/kept-shape';
import { expect, it } from 'vitest';

const at = (p: number) => ({ mean: 20 * p, variance: 20 * p * (1 - p) });
const ceiling = (mean: number) => mean * (1 - mean / 20);

it('agrees with the variance of a mixture by hand: 1 + 19δ²/(p(1 − p)) ceilings', () => {
  const shift = shiftForExcess(at, ceiling, { p: 0.2, trials: 20, shots: 1000, strength: 2 });
  // 2.49·√(2(1 − 1/N)/S): the scatter of variance over the ceiling of equal trials.
  const excess = 2 * 2.49 * Math.sqrt(1.9 / 1000);
  expect(shift).toBeCloseTo(Math.sqrt((excess * 0.16) / 19), 10);
});

it('is none where none is asked for, and refuses what no shift gives', () => {
  expect(shiftForExcess(at, ceiling, { p: 0.2, trials: 20, shots: 1000, strength: 0 })).toBe(0);
  expect(() => shiftForExcess(at, ceiling, { p: 0.01, trials: 20, shots: 10, strength: 9 })).toThrow(
    RangeError
  );
});

it('goes by the scatter that it is given', () => {
  const asked = { p: 0.2, trials: 20, shots: 1000, strength: 2 };
  // A quarter of the scatter asks for half the excess, and that for 1/√2 of the shift.
  const plain = shiftForExcess(at, ceiling, { ...asked, shape: () => 2 });
  expect(shiftForExcess(at, ceiling, { ...asked, shape: () => 0.5 }) / plain).toBeCloseTo(Math.SQRT1_2, 10);
});

it('of a declared cut is that of the smallest excess that its diagnosis tells', async () => {
  const cut = nuisances.find(({ id }) => id === 'cut-both-ends')!;
  const data = cut.draw(generator(2, 0), 4000, 0);
  const { answer, moments } = await diagnose(data, {
    ...defaultOptions,
    ...cut.options,
    trials: cut.trials,
    resamples: 19
  });
  const shape = keptShape(keptEqual(20, { from: 1, to: 7 }, moments.mean.value!))!;
  expect(answer.smallestExcess!).toBeCloseTo(2.49 * Math.sqrt(shape / 4000), 4);
  // 2(1 − 1/N) of 20 whole trials is 1.9.
  expect(shape).toBeLessThan(1.9);
});
