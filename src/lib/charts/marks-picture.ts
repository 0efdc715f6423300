import type { DeviceTimeline } from '$lib/model/team/devices/timeline';
import type { Mark as CellMark } from '$lib/stats/versions/types';
import { scaleLinear } from 'd3-scale';
import { bottomAxis } from './axis-marks';
import { crossPath } from './cross-path';
import { frameOf } from './frame-of';
import { MARKS, markWords } from './marks-words';
import { nameTicks } from './name-ticks';
import type { LegendEntry, Mark, Picture, Point, Role, Size } from './picture';
import { pointPath, type Shape } from './point-path';

const LOOKS: Record<CellMark, { role: Role; shape: Shape | 'cross'; size: number; label: string }> = {
  reference: { role: 'corner', shape: 'cross', size: 5, label: 'the reference' },
  unmarked: { role: 'corner', shape: 'cross', size: 5, label: MARKS.unmarked },
  'no-difference-seen': { role: 'observed', shape: 'dot', size: 4, label: MARKS['no-difference-seen'] },
  'cannot-tell': { role: 'observed-unsure', shape: 'diamond', size: 7, label: MARKS['cannot-tell'] },
  differs: { role: 'law', shape: 'dot', size: 8, label: 'differs otherwise: another mean, or less variance' },
  risen: { role: 'observed-more', shape: 'up', size: 10, label: 'risen: more variance over ceiling' }
};

/** Groups down, versions across: a mark a cell, so that one sees at a glance where the variance rose. */
export function marksPicture(
  { groups, versions, marks }: Pick<DeviceTimeline, 'groups' | 'versions' | 'marks'>,
  { width, text }: Size
): Picture {
  const row = text * 1.6;
  const top = text * 1.2;
  const names = versions.map(({ name }) => name);
  const letters = Math.max(4, Math.floor((width * 0.38) / (text * 0.6)));
  const shown = groups.map((name) => shortened(name, letters));
  const left = Math.max(3, ...shown.map((name) => [...name].length)) * text * 0.6 + text;
  const height = top + Math.max(40, row * groups.length) + text * 3.8;
  const frame = frameOf(width, height, { left, right: text * 1.8, top, bottom: text * 3.8 });
  const x = scaleLinear([-0.5, Math.max(1, names.length) - 0.5], [frame.left, frame.right]);
  const y = (i: number) => frame.top + row * (i + 0.5);
  const apart = (frame.right - frame.left) / Math.max(1, names.length);
  const cells = marks.flatMap((line, i) =>
    line.flatMap((cell, j) => (cell ? [{ cell, i, j, at: [x(j), y(i)] as Point }] : []))
  );
  const kinds = Object.keys(LOOKS) as CellMark[];
  const of = (kind: CellMark): Mark[] => {
    const { role, shape, size } = LOOKS[kind];
    const points = cells.filter(({ cell }) => cell.mark === kind).map(({ at }) => at);
    if (points.length === 0) return [];
    const d =
      shape === 'cross'
        ? points.map(([at, up]) => crossPath(at, up)).join('')
        : pointPath(points, shape, Math.min(size, Math.max(3, apart)));
    return [{ kind: 'path', role, d }];
  };
  const lines = groups.map((_, i) => `M${frame.left},${y(i).toFixed(2)}H${frame.right}`).join('');
  return {
    width,
    height,
    build: 'lines',
    marks: [
      { kind: 'path', role: 'grid', d: lines },
      ...shown.map((name, i): Mark => ({
        kind: 'text',
        x: frame.left - 8,
        y: y(i) + text * 0.35,
        text: name,
        anchor: 'end',
        ink: 'ink',
        face: 'text',
        size: text
      })),
      ...kinds.flatMap(of),
      ...bottomAxis(
        frame,
        nameTicks(
          names,
          names.map((_, i) => x(i)),
          [0, width],
          text
        ),
        'firmware version, in order',
        text
      )
    ],
    legend: kinds.flatMap((kind): LegendEntry[] =>
      cells.some(({ cell }) => cell.mark === kind)
        ? [{ role: LOOKS[kind].role, label: LOOKS[kind].label, bare: true }]
        : []
    ),
    order: 'all-over',
    readings: cells.map(({ cell, i, j, at }) => ({
      x: at[0],
      y: at[1],
      words: () => `${groups[i]}, version ${names[j]}: ${markWords(cell)}.`
    })),
    notes: []
  };
}

function shortened(name: string, most: number): string {
  const letters = [...name];
  return letters.length > most ? `${letters.slice(0, most - 1).join('')}…` : name;
}
