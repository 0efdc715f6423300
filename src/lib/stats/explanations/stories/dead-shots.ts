import { deepScale } from '../../laws/window';
import { baseWindow } from '../base-window';
import { mixture } from '../mixture';
import type { Story } from '../story';

/**
 * Dead shots: a share of the shots failed and has count 0, the others are equal trials (zero-inflated binomial, or
 * Poisson when N is unknown). Source of the form: Lambert 1992, Technometrics 34:1 (m).
 */
export const deadShots: Story = {
  id: 'dead-shots',
  refuses: () => null,
  own: () => [{ symbol: 'share', low: 0, high: 0.98 }],
  starts: ({ empty }) => [[Math.min(0.9, Math.max(0.001, empty))], [Math.max(0.001, empty / 4)]],
  base: (mean, [share], trials) => Math.min((trials ?? Infinity) - 1e-9, mean / (1 - share)) / (trials ?? 1),
  window: (base, [share], trials) =>
    mixture(
      share,
      { first: 0, values: Float64Array.of(deepScale), scale: deepScale },
      baseWindow(trials, base)
    ),
  meaning: ({ percent }) =>
    `A share of the shots, ${percent}, failed as a whole and shows no defect, such as a failed preparation or lost atoms; all other shots are independent trials.`
};
