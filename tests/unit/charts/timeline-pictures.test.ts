import { marksPicture } from '$lib/charts/marks-picture';
import { marksTable } from '$lib/charts/marks-table';
import { timelinePicture } from '$lib/charts/timeline-picture';
import { timelineTable } from '$lib/charts/timeline-table';
import { marksTitle, timelineTitle } from '$lib/charts/timeline-titles';
import type { DeviceTimeline, TimelineMark, TimelinePoint } from '$lib/model/team/devices/timeline';
import type { Mark } from '$lib/stats/versions/types';
import { describe, expect, it } from 'vitest';
import { faults } from './faults';

const point = (version: string, value: number, more: Partial<TimelinePoint> = {}): TimelinePoint => ({
  version,
  label: `of ${version}`,
  shots: 5000,
  mean: { value: 6 * value, low: 5.9 * value, high: 6.1 * value },
  dispersion: { value, low: value - 0.04, high: value + 0.04 },
  divergence: { value: 0.001, low: null, high: 0.002 },
  divergenceLimit: 0.003,
  verdict: 'compatible',
  limits: { mean: [5.8, 6.2], dispersion: [0.94, 1.06] },
  rise: { factor: value, p: 0.2, pAdjusted: 1 },
  mark: 'no-difference-seen',
  hindrances: [],
  ...more
});

const cell = (mark: Mark, more: Partial<TimelineMark> = {}): TimelineMark => ({
  mark,
  factor: 1.01,
  pAdjusted: 0.6,
  hindrance: null,
  seesRise: mark === 'no-difference-seen',
  ...more
});

function timeline(names: string[], groups: string[], of: (i: number, j: number) => TimelineMark | null) {
  const points = names.map((name, i) =>
    point(name, 1 + (i % 5) / 30, i === 0 ? { limits: null, mark: 'reference' } : {})
  );
  return {
    versions: names.map((name) => ({ id: name, name })),
    reference: names.at(0) ?? null,
    goneReference: null,
    goneGroup: false,
    groups,
    group: groups.at(0) ?? null,
    alpha: 0.05,
    tolerance: 0.1,
    points,
    marks: groups.map((_, i) => names.map((__, j) => of(i, j))),
    outOfOrder: null,
    statement: '',
    because: [],
    cautions: []
  } satisfies DeviceTimeline;
}

const ALL: Mark[] = ['reference', 'risen', 'differs', 'no-difference-seen', 'cannot-tell', 'unmarked'];

describe('every chart', () => {
  const many = (start: string, count: number) => Array.from({ length: count }, (_, i) => `${start}${i + 1}`);
  it.each<[string, DeviceTimeline]>([
    ['one version', timeline(['1.0'], ['whole device'], () => cell('reference'))],
    ['four of eight groups', timeline(many('ebb 3.', 4), many('q', 8), (i, j) => cell(ALL[(i + j) % 6]))],
    [
      'fifty of a hundred',
      timeline(many('build ', 50), many('group ', 100), (i, j) => (i === j ? null : cell(ALL[(i * j) % 6])))
    ],
    ['names without end', timeline(many('a'.repeat(90), 7), many('b'.repeat(90), 3), () => cell('risen'))],
    [
      'nothing that is known',
      {
        ...timeline(['a', 'b'], ['q'], () => cell('cannot-tell', { hindrance: 'lumped', factor: null })),
        points: [point('a', 1, { mean: null, dispersion: null, divergence: null, limits: null })]
      }
    ]
  ])('of %s is finite and inside its frame', (_name, drawn) => {
    for (const width of [260, 342, 760, 1400]) {
      const size = { width, text: 13 };
      expect(faults(marksPicture(drawn, size)), `marks ${width}`).toEqual([]);
      for (const quantity of ['dispersion', 'mean', 'divergence'] as const)
        expect(faults(timelinePicture(drawn, quantity, size)), `${quantity} ${width}`).toEqual([]);
    }
    expect(marksTable(drawn).rows).toHaveLength(drawn.marks.flat().filter((one) => one !== null).length);
  });
});

describe('the timeline of a group', () => {
  const drawn = {
    ...timeline(['a', 'b', 'c', 'd'], ['q1', 'q2'], (i, j) =>
      cell(j === 0 ? 'reference' : i === 0 && j === 2 ? 'risen' : 'no-difference-seen')
    ),
    points: [point('a', 1, { limits: null }), point('b', 1.02), point('c', 1.3), point('d', 0.8)]
  };

  it('shows by shape and ink which versions leave the limits, and says so in its title', () => {
    const { marks } = timelinePicture(drawn, 'dispersion', { width: 760, text: 13 });
    const roles = marks.flatMap((mark) => (mark.kind === 'path' ? [mark.role] : []));
    expect(roles).toEqual(
      expect.arrayContaining(['observed', 'observed-more', 'observed-fewer', 'limit', 'level'])
    );
    expect(timelineTitle(drawn, 'dispersion')).toBe(
      'The variance over ceiling of q1 rises above its limits in 1 and falls below them in 1 of 3 versions beside a'
    );
    const quiet = { ...drawn, points: drawn.points.slice(0, 2) };
    expect(timelineTitle(quiet, 'dispersion')).toBe(
      'The variance over ceiling of q1 stays within its limits in the one version beside a'
    );
  });

  it('has an upper limit of the divergence alone, and every number in its table', () => {
    const { marks } = timelinePicture(drawn, 'divergence', { width: 760, text: 13 });
    const limits = marks.flatMap((mark) => (mark.kind === 'path' && mark.role === 'limit' ? [mark.d] : []));
    expect(limits.join('').match(/M/g)).toHaveLength(drawn.points.length);
    expect(timelineTable(drawn, 'divergence').columns.at(-1)?.title).toBe('upper limit');
    expect(timelineTable(drawn, 'divergence').rows[1].at(-1)).toBe(0.003);
    const over = {
      ...drawn,
      points: drawn.points.map((one, i) => ({ ...one, divergenceLimit: i ? 0.0005 : null }))
    };
    expect(timelineTitle(over, 'divergence')).toMatch(
      /divergence of q1 rises above its limits in 3 of 3 versions beside a/
    );
    expect(timelineTable(drawn, 'mean').rows[1]).toEqual([
      'b',
      'of b',
      5000,
      6.12,
      5.9 * 1.02,
      6.1 * 1.02,
      5.8,
      6.2
    ]);
  });

  it('tells of rises first, and never of more than was seen', () => {
    expect(marksTitle(drawn)).toBe('The variance rises over a in 1 of 6 cells');
    expect(marksTable(drawn).rows[0].slice(0, 3)).toEqual(['q1', 'c', 'risen']);
    const blind = { ...drawn, marks: [[cell('reference'), cell('cannot-tell')]] };
    expect(marksTitle(blind)).toBe('Nothing can be told of a rise over a yet');
  });
});
