import { ceilingPicture } from '$lib/charts/ceiling-picture';
import { legendSample } from '$lib/charts/legend-sample';
import type { Picture, Role, TextMark } from '$lib/charts/picture';
import { ratePicture } from '$lib/charts/rate-picture';
import { tailsPicture } from '$lib/charts/tails-picture';
import { testsPicture } from '$lib/charts/tests-picture';
import { TESTS } from '$lib/model/labels';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from './any-diagnosis';
import { coordinates, extent } from './measure';

describe('what a legend and a label say', () => {
  const drawn = ({ marks }: Picture, role: Role) =>
    marks.some((mark) => mark.kind === 'path' && mark.role === role && mark.d !== '');
  it('the triangles of the rates and tails are in the legend when they are drawn', async () => {
    // Far wider than the law of 12 trials: some counts too often, some too seldom.
    const wide: [number, number][] = [
      [0, 400],
      [3, 100],
      [6, 900],
      [9, 100],
      [12, 400]
    ];
    for (const diagnosis of [await anyDiagnosis(wide, { trials: 12 }), await anyDiagnosis([[3, 700]])])
      for (const draw of [ratePicture, tailsPicture]) {
        const picture = draw(diagnosis, { width: 760, text: 13 });
        for (const role of ['observed-more', 'observed-fewer'] as const)
          expect(picture.legend.some((entry) => entry.role === role)).toBe(drawn(picture, role));
      }
    expect(
      drawn(ratePicture(await anyDiagnosis(wide, { trials: 12 }), { width: 760, text: 13 }), 'observed-more')
    ).toBe(true);
  });
  it('never seen, horizon and edge are in the legend when they are drawn, and only then', async () => {
    const none: [number, number][] = [
      [0, 300],
      [1, 500],
      [2, 200]
    ];
    const seen = new Set<string>();
    for (const diagnosis of [
      await anyDiagnosis(WELDON, { trials: 12 }),
      await anyDiagnosis(none, { trials: 2 }),
      await anyDiagnosis([[3, 700]])
    ])
      for (const [name, draw] of Object.entries({ ratePicture, tailsPicture })) {
        const picture = draw(diagnosis, { width: 760, text: 13 });
        for (const role of ['unseen', 'shade', 'bound'] as const) {
          const there = picture.legend.some((entry) => entry.role === role);
          expect(there, `${name} ${role}`).toBe(drawn(picture, role));
          seen.add(`${role} ${there}`);
        }
      }
    expect([...seen].sort()).toEqual(expect.arrayContaining(['unseen false', 'unseen true', 'bound true']));
  });
  it('an edge that holds at one count alone is drawn over the width of that count', async () => {
    // Mean 1.4: of the low counts 0 alone lies one below it.
    const low: [number, number][] = [
      [0, 300],
      [1, 200],
      [2, 350],
      [3, 150]
    ];
    const picture = tailsPicture(await anyDiagnosis(low, { trials: 40 }), { width: 760, text: 13 });
    const zero = picture.readings[0].x;
    for (const role of ['bound', 'hatch'] as const) {
      const path = picture.marks.find((mark) => mark.kind === 'path' && mark.role === role);
      if (path?.kind !== 'path') throw new Error(`no ${role}`);
      const { x } = coordinates(path.d);
      expect(x.some((at) => Math.abs(at - zero) < 40)).toBe(true);
    }
  });
  it('the smallest p is an upright tick in chart and legend', () => {
    expect(legendSample({ role: 'smallest' })).toEqual([{ kind: 'path', role: 'smallest', d: 'M15,2V14' }]);
  });
  it('the tests chart explains strokes and ticks only where it draws them, and its points have none', async () => {
    // One shot over and over: no test runs but those that show nothing; the dice have strokes.
    const seen = new Set<boolean>();
    for (const diagnosis of [await anyDiagnosis(WELDON, { trials: 12 }), await anyDiagnosis([[3, 700]])]) {
      const picture = testsPicture(diagnosis, { width: 760, text: 13 }, TESTS);
      const strokes = (['interval', 'interval-more', 'interval-fewer', 'interval-unsure'] as const).some(
        (role) => drawn(picture, role)
      );
      seen.add(strokes);
      const inLegend = (role: Role) => picture.legend.some((entry) => entry.role === role);
      expect(inLegend('interval')).toBe(strokes);
      expect(inLegend('smallest')).toBe(drawn(picture, 'smallest'));
      for (const entry of picture.legend.filter(({ role }) => role.startsWith('observed')))
        expect(legendSample(entry).map((mark) => mark.kind === 'path' && mark.role)).toEqual([entry.role]);
    }
    expect([...seen].sort()).toEqual([false, true]);
    expect(legendSample({ role: 'observed' })).toHaveLength(2);
  });
  it('the excess that matters is named right of the ceiling, narrow and wide', async () => {
    const diagnosis = await anyDiagnosis(WELDON, { trials: 12 });
    for (const width of [342, 760]) {
      const { marks } = ceilingPicture(diagnosis, { width, text: 13 });
      const label = marks.find((mark): mark is TextMark => mark.kind === 'text' && /matters/.test(mark.text));
      const bound = marks.find((mark) => mark.kind === 'path' && mark.role === 'bound');
      if (!label || bound?.kind !== 'path') throw new Error('nothing to compare');
      expect(extent(label)[0]).toBeGreaterThan(coordinates(bound.d).x[0]);
    }
  });
  it('the last label of the tests chart has its room at 342 units', async () => {
    for (const alpha of [0.01, 1e-6]) {
      const { marks, width } = testsPicture(
        await anyDiagnosis(WELDON, { trials: 12, alpha }),
        { width: 342, text: 13 },
        TESTS
      );
      const ends = marks.flatMap((mark) =>
        mark.kind === 'text' && mark.face === 'number' ? [extent(mark)[1]] : []
      );
      expect(Math.max(...ends)).toBeLessThanOrEqual(width - 2);
    }
  });
});
