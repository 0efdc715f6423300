import { ceilingPicture } from '$lib/charts/ceiling-picture';
import { driftPicture } from '$lib/charts/drift-picture';
import { explanationsPicture } from '$lib/charts/explanations-picture';
import { distributionPicture } from '$lib/charts/distribution-picture';
import { cumulantsPlace } from '$lib/charts/cumulants-place';
import type { Picture, Size } from '$lib/charts/picture';
import { powerPicture } from '$lib/charts/power-picture';
import { publishedPlace } from '$lib/charts/published-place';
import { ratePicture } from '$lib/charts/rate-picture';
import { regionPicture } from '$lib/charts/region-picture';
import { sheetOf } from '$lib/charts/sheet-of';
import { sheetToSvg } from '$lib/charts/sheet-to-svg';
import { tailsPicture } from '$lib/charts/tails-picture';
import { testsPicture } from '$lib/charts/tests-picture';
import { trialsPicture } from '$lib/charts/trials-picture';
import { TESTS } from '$lib/model/labels';
import type { TrialsPart } from '$lib/stats/sensitivity/types';
import type { DriftPart } from '$lib/stats/drift/types';
import type { Explanations } from '$lib/stats/explanations/types';
import { judgeCumulants } from '$lib/stats/cumulants-only/judge-cumulants';
import { powerCurve } from '$lib/stats/planning/power-curve';
import type { Diagnosis } from '$lib/stats/types';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from './any-diagnosis';
import { CASES } from './cases';
import { faults } from './faults';

const nothing: Explanations = {
  ranked: [],
  tied: [],
  tieWithin: 2,
  separate: [],
  shotsToLead: null,
  notRun: [],
  pairs: null,
  statement: ''
};

const noOrder: DriftPart = { means: [], change: null, split: null, statement: '' };

const noTrials: TrialsPart = { points: [], critical: null, statement: '' };

type Draw = (diagnosis: Diagnosis, size: Size) => Picture;
const DRAWS: [string, Draw][] = [
  ['counts', distributionPicture],
  ['rate', ratePicture],
  ['tails', tailsPicture],
  ['ceiling', ceilingPicture],
  [
    'region',
    (diagnosis, size) => {
      const place = cumulantsPlace(diagnosis);
      return 'reason' in place ? ceilingPicture(diagnosis, size) : regionPicture(place, size);
    }
  ],
  ['tests', (diagnosis, size) => testsPicture(diagnosis, size, TESTS)],
  // Only shot lists have these.
  ['means', ({ nuisances }, size) => driftPicture(nuisances?.drift ?? noOrder, size)],
  // Counts with a spread have these.
  ['as N runs', ({ nuisances }, size) => trialsPicture(nuisances?.trials ?? noTrials, size)],
  // Only results that rule independent trials out have these; the others draw an empty list.
  [
    'explanations',
    ({ explanations, engine }, size) => explanationsPicture(explanations ?? nothing, size, engine.alpha)
  ]
];

const faultsOf = (diagnosis: Diagnosis, width: number): string[] =>
  DRAWS.flatMap(([name, draw]) =>
    faults(draw(diagnosis, { width, text: 13 })).map((fault) => `${name}: ${fault}`)
  );

describe('every chart', () => {
  it.each(CASES)('of %s is finite and inside its frame, narrow and wide', async (_name, make) => {
    const diagnosis = await make();
    for (const width of [260, 342, 760, 1400]) expect(faultsOf(diagnosis, width)).toEqual([]);
  });

  it.each([21, 383, 30_000, 2e9, 8e14])('of a plan of %d shots is finite and inside its frame', (shots) => {
    const curve = powerCurve({ kind: 'excess', size: 0.1, mean: 4, trials: null }, 0.05, 2.5 * shots);
    const plan = { curve, shots, power: 0.8, asked: 0.8 };
    for (const width of [260, 342, 760, 1400])
      expect(faults(powerPicture(plan, { width, text: 13 })), `${width}`).toEqual([]);
  });

  it.each([
    ['inside', 3.5, 3, 64],
    ['near', 4.1, 4, null],
    ['far over', 60, 900, 8],
    ['far under', 0.4, -30, null]
  ])('of printed cumulants %s is finite and inside its frame', (_name, variance, third, trials) => {
    const measured = (value: number) => ({ value, error: 0.05 + Math.abs(value) / 20 });
    const printed = {
      trials,
      mean: measured(4),
      variance: measured(variance),
      third: measured(third),
      fourth: null
    };
    const verdict = { ...judgeCumulants(printed), verdict: 'ruled-out' as const };
    const place = publishedPlace(printed, verdict)!;
    for (const width of [260, 342, 760, 1400]) {
      const picture = regionPicture(place, { width, text: 13 });
      expect(faults(picture), `${width}`).toEqual([]);
      // A cross that no word stands by says nothing.
      const names = picture.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []));
      expect(names, `${width}`).toContain('Poisson');
      if (trials !== null) expect(names, `${width}`).toContain('equal trials');
    }
  });

  it('of any counts is finite and inside its frame', async () => {
    const histogram = fc.uniqueArray(
      fc.tuple(fc.integer({ min: 0, max: 60 }), fc.integer({ min: 1, max: 5000 })),
      {
        minLength: 1,
        maxLength: 12,
        selector: ([count]) => count
      }
    );
    await fc.assert(
      fc.asyncProperty(
        histogram,
        fc.option(fc.integer({ min: 60, max: 400 })),
        fc.integer({ min: 260, max: 1600 }),
        async (rows, trials, width) => {
          const counts = [...rows].sort((a, b) => a[0] - b[0]);
          expect(faultsOf(await anyDiagnosis(counts, { trials, resamples: 19 }), width)).toEqual([]);
        }
      ),
      { numRuns: 40, seed: 20 }
    );
  });

  it('of 10 000 counts gathers them, says so, and keeps every reading', async () => {
    const base = await anyDiagnosis(WELDON, { trials: 12 });
    const many: Diagnosis = {
      ...base,
      data: { ...base.data, shots: 3e8, trials: 20_000 },
      distribution: Array.from({ length: 10_000 }, (_, count) => {
        const observed = Math.exp(-(((count - 5000) / 900) ** 2) / 2) / 2256;
        return {
          count,
          density: count / 20_000,
          shots: 1 + Math.round(observed * 3e8),
          observed,
          low: observed * 0.98,
          high: observed * 1.02 + 1e-9,
          fitted: observed,
          lump: false
        };
      })
    };
    const picture = distributionPicture(many, { width: 760, text: 13 });
    expect(faults(picture)).toEqual([]);
    expect(picture.readings).toHaveLength(10_000);
    expect(picture.notes.join()).toMatch(/covers \d+ neighbouring counts/);
    const letters = picture.marks.reduce((sum, mark) => sum + (mark.kind === 'path' ? mark.d.length : 0), 0);
    expect(letters).toBeLessThan(300_000);
  });

  it('becomes a file that names no style and closes what it opens', async () => {
    const diagnosis = await anyDiagnosis(WELDON, { trials: 12 });
    for (const [name, draw] of DRAWS) {
      const svg = sheetToSvg(
        sheetOf(draw(diagnosis, { width: 720, text: 13 }), `A <title> & "more" of ${name}`, 'source'),
        'a & b'
      );
      expect(svg).toContain('a &amp; b');
      expect(svg).not.toMatch(/style=|<title> &(?!amp)|var\(/);
      expect(svg.match(/<text /g)?.length).toBe(svg.match(/<\/text>/g)?.length);
    }
  });
});
