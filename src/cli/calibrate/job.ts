import type { Outcome } from '$lib/stats/calibration/outcome';
import { repeat, type RepeatOptions } from '$lib/stats/calibration/repeat';
import { nuisances } from '$lib/stats/calibration/nuisances';
import {
  nuisanceSetting,
  truthSetting,
  violationSetting,
  type Setting
} from '$lib/stats/calibration/setting';
import { truths } from '$lib/stats/calibration/truths';
import { violations } from '$lib/stats/calibration/violations';

/** A few repeats of one setting, small enough that two threads end at about the same time. */
export interface Job {
  /** Which row of the result the outcomes belong to. */
  row: number;
  /** A truth when `strength` is null, else a violation or a nuisance. */
  id: string;
  strength: number | null;
  shots: number;
  from: number;
  to: number;
  options: RepeatOptions;
}

/** Runs a job. The outcomes depend on the job alone, so it does not matter which thread has it. */
export async function runJob({ id, strength, shots, from, to, options }: Job): Promise<Outcome[]> {
  const setting = settingOf(id, strength);
  const outcomes: Outcome[] = [];
  for (let index = from; index < to; index++) outcomes.push(await repeat(setting, shots, index, options));
  return outcomes;
}

function settingOf(id: string, strength: number | null): Setting {
  const nuisance = nuisances.find((one) => one.id === id);
  if (nuisance) return nuisanceSetting(nuisance, strength ?? 0);
  return strength === null
    ? truthSetting(truths.find((truth) => truth.id === id)!)
    : violationSetting(
        violations.find((violation) => violation.id === id)!,
        strength
      );
}
