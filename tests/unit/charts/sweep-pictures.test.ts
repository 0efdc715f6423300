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
    for (const width of [260, 342, 760, 1400])
      for (const draw of [sweepPicture, windowsPicture])
        expect(faults(draw(report, { width, text: 13 })), `${width}`).toEqual([]);
  });
});
