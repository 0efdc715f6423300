import { answersPicture } from '$lib/charts/answers-picture';
import { answersTitle } from '$lib/charts/answers-title';
import { ratioPicture } from '$lib/charts/ratio-picture';
import { ratioTitle } from '$lib/charts/ratio-title';
import { sweepDispersionPicture } from '$lib/charts/sweep-dispersion-picture';
import { sweepDispersionTitle } from '$lib/charts/sweep-dispersion-title';
import { sweepPicture } from '$lib/charts/sweep-picture';
import { windowsPicture } from '$lib/charts/windows-picture';
import { sweepReport } from '$lib/stats/sweep/sweep-report';
import { describe, expect, it } from 'vitest';
import { faults } from './faults';

describe('every chart', () => {
  it.each([
    ['nine over two decades', 9, 100, 4000],
    ['two close by', 2, 1.01, 40],
    ['a hundred', 100, 1e4, 900],
    ['thirty over twelve decades', 30, 1e12, 5000]
  ])('of a sweep of %s is finite and inside its frame', (_name, number, span, most) => {
    const report = sweepReport(
      Array.from({ length: number }, (_, i) => ({
        label: `${i}`,
        time: span ** (i / (number - 1)),
        ...(i % 5 < 4 && {
          dataset: {
            id: `${i}`,
            digest: '',
            verdict: (['compatible', 'ruled-out', 'undecided', null] as const)[i % 5],
            dispersion: i % 5 < 3 ? { value: 0.5 + (i % 7) / 5, low: 0.1, high: i % 3 ? 2 : null } : null
          }
        }),
        counts: [0, 1, 2, 3, 4].map((n): [number, number] => [n, 1 + Math.round(most / (1 + n * i))])
      })),
      {
        axis: 'hold-time',
        timeUnit: 'µs',
        unit: 'defect',
        window: number > 4 ? { from: span ** 0.2, to: span ** 0.8 } : null,
        transition: { dimension: 1, correlation: 1, dynamic: 1 },
        alpha: 0.05
      }
    );
    expect(report.steady.map(({ id }) => id)).toContain('pair-factor');
    for (const width of [260, 342, 760, 1400]) {
      const size = { width, text: 13 };
      const pictures = [
        ...[sweepPicture, windowsPicture, answersPicture, sweepDispersionPicture].map((draw) =>
          draw(report, size)
        ),
        ...report.steady.map((one) => ratioPicture(report, one, size))
      ];
      for (const picture of pictures) {
        expect(faults(picture), `${width}`).toEqual([]);
        expect(picture.readings.length).toBeGreaterThan(0);
      }
    }
  });
});

describe('titles of a sweep', () => {
  const reference = { id: 'landau-zener', value: 0.293, error: 0, inside: true };
  const steady = {
    id: 'variance-over-mean' as const,
    steady: { value: 0.3, low: 0.2, high: 0.4 },
    chiSquare: 1,
    freedom: 3,
    p: 0.4,
    references: [reference]
  };
  it.each([
    ['κ₂/κ₁ keeps to 0.3000 within errors: within reach of Landau–Zener modes', {}],
    [
      'κ₂/κ₁ keeps to 0.3000 within errors: none of the known laws has it',
      { references: [{ ...reference, inside: false }] }
    ],
    ['κ₂/κ₁ is not the same at every time', { p: 0.001 }],
    ['F₂/F₁² keeps to 0.3000 within errors', { id: 'pair-factor' as const, references: [] }],
    ['F₂/F₁² changes with the hold time', { id: 'pair-factor' as const, references: [], p: 0.01 }]
  ])('%s', (title, more) => expect(ratioTitle({ ...steady, ...more }, { alpha: 0.05 })).toBe(title));

  const point = (verdict: 'compatible' | 'ruled-out' | null, low: number | null = 0.9) => ({
    label: 'a',
    time: 1,
    shots: 9,
    inWindow: true,
    cumulants: null,
    ratios: null,
    dataset: { id: 'a', digest: '', verdict, dispersion: verdict && { value: 1, low, high: 2 } }
  });

  it('say how many of the datasets have which answer', () => {
    expect(answersTitle({ points: [point(null), point(null)] })).toBe('None of the 2 datasets was diagnosed');
    expect(answersTitle({ points: [point('compatible'), point('ruled-out'), point(null)] })).toBe(
      'Independent trials, of 3 datasets: ruled out in 1, compatible in 1, not diagnosed in 1'
    );
  });

  it('say how many are over the ceiling, errors allowed for', () => {
    const points = [point('ruled-out', 1.1), point('compatible'), point('compatible', null), point(null)];
    expect(sweepDispersionTitle({ points })).toBe('The variance is over its ceiling in 1 of 3 datasets');
    expect(sweepDispersionTitle({ points: points.slice(1) })).toBe(
      'The variance is nowhere surely over its ceiling'
    );
  });
});
