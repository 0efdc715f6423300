import { copyLevels, type TrialLevels } from './trial-levels';

/** Places a trial is carried to: near the ends, and a third of the way in. */
const places = [0.04, 0.35, 0.65, 0.96];

/**
 * Laws in other valleys: one trial of a level, of the sure or of the impossible ones carried far away, the others
 * shifted to keep the mean. Where the data are far from every independent-trial law, as with a gap in the counts,
 * the maximum found from smooth starts can lie several nats under another that differs by one such trial.
 */
export function carried(levels: TrialLevels): TrialLevels[] {
  const out: TrialLevels[] = [];
  const count = levels.p.length;
  for (let from = -1; from <= count; from++) {
    if (from < 0 ? levels.ones === 0 : from === count && levels.zeros === 0) continue;
    const home = from < 0 ? 1 : from === count ? 0 : levels.p[from];
    for (const place of places) {
      if (Math.abs(place - home) < 0.1) continue;
      const next = copyLevels(levels);
      if (from < 0) next.ones--;
      else if (from === count) next.zeros--;
      else next.trials[from]--;
      shift(next, home - place);
      next.p.push(place);
      next.trials.push(1);
      out.push(without(next));
    }
  }
  return out;
}

/** Moves the levels by `total` in all, each in proportion to its variance, a Poisson part with them. */
function shift(levels: TrialLevels, total: number): void {
  const weigh = (j: number) => levels.trials[j] * levels.p[j] * (1 - levels.p[j]);
  let weight = levels.poissonPart;
  for (let j = 0; j < levels.p.length; j++) weight += weigh(j);
  if (!(weight > 0)) return;
  const part = total / weight;
  levels.p = levels.p.map((p) => Math.min(0.97, Math.max(0.03, p + part * p * (1 - p))));
  if (levels.poissonPart > 0) levels.poissonPart *= Math.max(0.1, 1 + part);
}

/** Levels that ran empty taken out. */
function without(levels: TrialLevels): TrialLevels {
  const kept = levels.p.map((_, j) => j).filter((j) => levels.trials[j] > 0);
  const out = copyLevels(levels);
  out.p = kept.map((j) => levels.p[j]);
  out.trials = kept.map((j) => levels.trials[j]);
  return out;
}
