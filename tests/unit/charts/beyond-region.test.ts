import { cumulantsPlace, type CumulantsPlace } from '$lib/charts/cumulants-place';
import { cumulantsTitle } from '$lib/charts/cumulants-title';
import { inkOfRole } from '$lib/charts/ink-of-role';
import { regionPicture } from '$lib/charts/region-picture';
import { misreadKinks } from '$lib/stats/demo/misread-kinks';
import { tally } from '$lib/stats/demo/tally';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import type { Diagnosis, DiagnoseOptions } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis } from './any-diagnosis';

/** 50 bonds, 1 % of the sites misread. */
const kinks = (misread: number | null): Promise<Diagnosis> => {
  const { rows, seed } = misreadKinks;
  const counts = rows((stream) => generator(seed, stream))
    .slice(1)
    .map((row) => row.split(',').map(Number) as [number, number]);
  return anyDiagnosis(counts, { trials: 50, geometry: 'open-bonds', misread, resamples: 199 });
};

/** Bin(20, 0.25) of which only counts from 4 to 7 are kept. */
const cut = (kept: DiagnoseOptions['kept']): Promise<Diagnosis> => {
  const random = generator(31, 0);
  const shots: number[] = [];
  while (shots.length < 8000) {
    const n = binomialSample(random, 20, 0.25);
    if (n >= 4 && n <= 7) shots.push(n);
  }
  return anyDiagnosis(tally(shots), { trials: 20, kept, resamples: 199 });
};
const placed = (diagnosis: Diagnosis): CumulantsPlace => {
  const place = cumulantsPlace(diagnosis);
  if ('reason' in place) throw new Error(place.reason);
  return place;
};
const inksOf = (place: CumulantsPlace): string[] =>
  regionPicture(place, { width: 760, text: 13 }).marks.flatMap((mark) =>
    mark.kind === 'path' ? [inkOfRole(mark.role).stroke, inkOfRole(mark.role).fill] : [mark.ink]
  );

describe('the region of cumulants where the answer allows for more', () => {
  it('misreads: their name is in the title, no oxide, and the reader is told why', async () => {
    const allowed = await kinks(0.01);
    expect(allowed.answer.verdict).toBe('compatible');
    const place = placed(allowed);
    // The raw cumulants do lie beyond: variance 1.239 times the naive ceiling, by the formula for flips.
    expect(place.standing).toBe('more');
    expect(cumulantsTitle(place)).toBe(
      'Not allowing for misreads, the cumulants lie beyond what any independent trials can reach'
    );
    expect(inksOf(place)).not.toContain('oxide');
    const { notes, readings, legend } = regionPicture(place, { width: 760, text: 13 });
    expect(legend.map(({ label }) => label).join()).toContain('beyond this edge, not allowing for misreads');
    expect(notes.join()).toMatch(/toggles two bonds at once.*times its ceiling.*has the misreads in it/s);
    expect(readings.map(({ words }) => words()).join()).toContain(
      'Not allowing for misreads: no independent trials have so large a variance'
    );
  });

  it('the same counts without a rate keep their red and their plain title', async () => {
    const plain = await kinks(null);
    expect(plain.answer.verdict).toBe('ruled-out');
    const place = placed(plain);
    expect(cumulantsTitle(place)).toBe('The cumulants lie beyond what any independent trials can reach');
    expect(inksOf(place)).toContain('oxide');
    expect(regionPicture(place, { width: 760, text: 13 }).notes).toEqual([]);
  });

  it('a cut is named likewise', async () => {
    const place = placed(await cut({ from: 4, to: 7 }));
    expect(cumulantsTitle(place)).toMatch(/^Not allowing for the cut, the /);
    expect(inksOf(place)).not.toContain('oxide');
    expect(regionPicture(place, { width: 760, text: 13 }).notes.join()).toMatch(
      /allows for the cut to counts from 4 to 7\..*of counts cut so\./s
    );
    expect(cumulantsTitle(placed(await cut(null)))).not.toMatch(/Not allowing/);
  });
});
