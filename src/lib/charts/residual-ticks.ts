import type { Tick } from './picture';
import { tickTexts } from './tick-texts';

/**
 * Labels of the residual strip at 0 and one round step to either side: 1 as long as the strip is about as high as an
 * interval, else the largest of 1, 2 or 5 times a power of ten that stays in it. From 10 000 on as a power, since the
 * margin holds no longer numbers: with 2^40 shots residuals run to millions.
 *
 * @param far largest residual shown, half-intervals
 * @returns `at` in half-intervals
 */
export function residualTicks(far: number): Tick[] {
  const power = 10 ** Math.floor(Math.log10(Math.max(1, far)) + 1e-12);
  const step = far <= 3 ? 1 : power * ([5, 2, 1].find((times) => times * power <= 0.95 * far) ?? 0.5);
  if (step < 10_000) {
    const texts = tickTexts([-step, 0, step]);
    return [-step, 0, step].map((at, i) => ({ at, text: texts[i] }));
  }
  const exponent = Math.floor(Math.log10(step) + 1e-12);
  const text = `${Math.round(step / 10 ** exponent)}×10`;
  const raised = String(exponent);
  return [
    { at: -step, text: `\u2212${text}`, raised },
    { at: 0, text: '0' },
    { at: step, text, raised }
  ];
}
