import { defaultOptions } from '../default-options';
import { diagnose } from '../diagnose';
import { generator } from '../random/generator';
import { mixSeed } from '../random/mix-seed';
import type { Diagnosis } from '../types';
import { outcomeOf, type Outcome } from './outcome';
import type { Setting } from './setting';

/** How hard each repeat looks. */
export interface RepeatOptions {
  /** Resamples of the first diagnosis. */
  resamples: number;
  /** Resamples that the whole answer is decided with where the first diagnosis leaves it open at α. */
  full: number;
  alpha: number;
  seed: number;
}

/**
 * Draws the shots of repeat number `index` and diagnoses them.
 *
 * Resample b depends on seed and b alone, so the first diagnosis is the beginning of the full one: exceedances
 * can only be added. Where even with none added no adjusted p could come to α, the full diagnosis would not
 * rule out either and is not run; so the share of "ruled out" at α is that of `full` resamples, for the price
 * of fewer.
 */
export async function repeat(
  setting: Setting,
  shots: number,
  index: number,
  { resamples, full, alpha, seed }: RepeatOptions
): Promise<Outcome> {
  // Two seeds from one mix: the engine's resamples cannot echo the shots.
  const [drawSeed, engineSeed] = mixSeed(nameSeed(`${setting.id} ${shots}`), seed * 2 ** 20 + index);
  const data = setting.draw(generator(drawSeed >>> 0, 0), shots);
  const options = {
    ...defaultOptions,
    ...setting.options,
    trials: setting.trials,
    alpha,
    seed: engineSeed >>> 0
  };
  const first = await diagnose(data, { ...options, resamples });
  if (resamples >= full || !open(first, full)) return outcomeOf(first, setting.cumulants);
  const second = outcomeOf(await diagnose(data, { ...options, resamples: full }), setting.cumulants);
  // p of single tests stay those of the first, so that all repeats of a table are alike.
  return { ...second, p: outcomeOf(first, setting.cumulants).p };
}

/** Whether `full` resamples could bring the smallest adjusted p to α when these did not, or undo it. */
function open({ tests, engine }: Diagnosis, full: number): boolean {
  return tests.some((test) => {
    if (test.resamples === 0 || test.stoppedEarly) return false;
    const exceeded = test.p * (test.resamples + 1);
    return (tests.length * exceeded) / (full + 1) <= engine.alpha;
  });
}

/** A seed from a name (FNV-1a, 32 bits), so that settings added later leave the numbers of others alone. */
function nameSeed(name: string): number {
  let hash = 0x811c9dc5;
  for (const letter of name) hash = Math.imul(hash ^ letter.charCodeAt(0), 0x01000193);
  return hash >>> 0;
}
