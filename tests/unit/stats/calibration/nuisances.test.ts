import { beforeAll, describe, expect, it } from 'vitest';
import { nuisances } from '$lib/stats/calibration/nuisances';
import { repeat } from '$lib/stats/calibration/repeat';
import { nuisanceSetting } from '$lib/stats/calibration/setting';
import { summary, type Summary } from '$lib/stats/calibration/summary';
import { highest, lowest } from './binomial-limits';

/**
 * The small, fixed-seed edition of `npm run calibrate -- --nuisance all`: whole diagnoses of independent trials as an
 * apparatus with one nuisance hands them over, the nuisance stated, without an excess and with twice the smallest that is
 * said to be seen. Limits are 99.9 % quantiles of a binomial law at 7 % false alarms and at 80 % power. Refits of chains
 * take most of the time, so they have the fewest repeats.
 */
const cells: [id: string, without: number, withExcess: number, resamples: number][] = [
  ['misread-bonds', 16, 8, 99],
  ['misread-bonds-unsure', 8, 10, 99],
  ['misread-ring', 16, 8, 99],
  ['misread-sites', 40, 12, 99],
  ['ring-in-pairs', 40, 12, 99],
  ['empty-dropped', 40, 12, 99],
  ['cut-both-ends', 40, 12, 99],
  ['lumped-both-ends', 40, 12, 99],
  ['drifting-batches', 40, 12, 99],
  // The shots that are not empty are looked at where dead shots were found.
  ['dead-set-aside', 20, 8, 199]
];
const SHOTS = 1000;

const quiet = new Map<string, Summary>();
const loud = new Map<string, Summary>();

async function measure(id: string, strength: number, repeats: number, resamples: number): Promise<Summary> {
  const setting = nuisanceSetting(
    nuisances.find((nuisance) => nuisance.id === id)!,
    strength
  );
  const outcomes = [];
  for (let index = 0; index < repeats; index++)
    outcomes.push(await repeat(setting, SHOTS, index, { resamples, full: resamples, alpha: 0.05, seed: 1 }));
  return summary(setting.id, SHOTS, outcomes);
}

beforeAll(async () => {
  for (const [id, without, withExcess, resamples] of cells) {
    quiet.set(id, await measure(id, 0, without, resamples));
    loud.set(id, await measure(id, 2, withExcess, resamples));
  }
}, 600_000);

it('every nuisance of the calibration is looked at here', () => {
  expect(cells.map(([id]) => id)).toEqual(nuisances.map(({ id }) => id));
});

describe('with the nuisance stated and no excess', () => {
  it.each(nuisances)('$id: no test alarms above 7 %', ({ id, judges }) => {
    const { alarms } = quiet.get(id)!;
    for (const name of judges) {
      const alarm = alarms[name];
      if (alarm) expect(alarm.hits, name).toBeLessThanOrEqual(highest(alarm.of, 0.07));
    }
    expect(judges.some((name) => alarms[name])).toBe(true);
  });

  it('each test over all nuisances: not above 7 %', () => {
    const names = new Set(nuisances.flatMap(({ judges }) => judges));
    for (const name of names) {
      const shares = nuisances
        .filter(({ judges }) => judges.includes(name))
        .map(({ id }) => quiet.get(id)!.alarms[name])
        .filter((share) => share !== undefined);
      const of = shares.reduce((sum, share) => sum + share.of, 0);
      const hits = shares.reduce((sum, share) => sum + share.hits, 0);
      expect(of, name).toBeGreaterThanOrEqual(20);
      expect(hits, name).toBeLessThanOrEqual(highest(of, 0.07));
    }
  });

  it('the whole answer is “ruled out” at most as often as its α allows', () => {
    const whole = nuisances.filter(({ judges }) => judges.includes('ceiling'));
    const shares = whole.map(({ id }) => quiet.get(id)!.ruledOut['0.05']);
    const hits = shares.reduce((sum, share) => sum + share.hits, 0);
    const of = shares.reduce((sum, share) => sum + share.of, 0);
    expect(hits).toBeLessThanOrEqual(highest(of, 0.05));
  });
});

describe('with twice the smallest excess', () => {
  it.each(nuisances)('$id: it is seen in at least 80 of 100 repeats', ({ id, sees }) => {
    const { alarms, compatible, repeats } = loud.get(id)!;
    const seen = alarms[sees]!;
    expect(seen.of).toBe(repeats);
    expect(seen.hits).toBeGreaterThanOrEqual(lowest(repeats, 0.8));
    expect(lowest(repeats, 0.8)).toBeGreaterThan(1);
    expect(compatible.hits).toBeLessThanOrEqual(highest(repeats, 0.05));
  });
});
