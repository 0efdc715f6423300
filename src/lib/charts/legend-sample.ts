import { crossPath } from './cross-path';
import { hatchEdge } from './hatch-edge';
import { intervalPath } from './interval-path';
import type { LegendEntry, Mark, Role } from './picture';
import { ruledShade } from './ruled-shade';
import { pointPath, type Shape } from './point-path';

const POINTS: Partial<Record<Role, { shape: Shape; interval: Role }>> = {
  observed: { shape: 'dot', interval: 'interval' },
  'observed-more': { shape: 'up', interval: 'interval-more' },
  'observed-fewer': { shape: 'down', interval: 'interval-fewer' },
  'observed-unsure': { shape: 'diamond', interval: 'interval-unsure' }
};

export const SAMPLE = { width: 30, height: 16 };

/** A small drawing of what an entry's marks look like, its top left corner at `left`, `top`. */
export function legendSample(
  { role, down, bare }: Pick<LegendEntry, 'role' | 'down' | 'bare'>,
  left = 0,
  top = 0
): Mark[] {
  const [foot, head] = down ? [top, top + SAMPLE.height] : [top + SAMPLE.height, top];
  const right = left + SAMPLE.width;
  const middle = top + SAMPLE.height / 2;
  const centre = left + SAMPLE.width / 2;
  const point = POINTS[role];
  if (point) {
    const d = pointPath([[centre, middle]], point.shape, point.shape === 'dot' ? 6 : 9);
    const stroke = intervalPath([{ x: centre, from: top + SAMPLE.height, to: top }]);
    return [
      ...(bare ? [] : [{ kind: 'path', role: point.interval, d: stroke } as const]),
      { kind: 'path', role, d }
    ];
  }
  if (role === 'unseen')
    return [
      {
        kind: 'path',
        role,
        d: intervalPath([{ x: centre, from: foot, to: head, open: true }])
      }
    ];
  if (role === 'shade') {
    const box = { left, right, top, bottom: top + SAMPLE.height };
    return [{ kind: 'path', role, d: ruledShade(box, box.top, box.bottom) }];
  }
  if (role === 'law') return [{ kind: 'path', role, d: pointPath([[centre, middle]], 'dot', 8) }];
  if (role === 'corner') return [{ kind: 'path', role, d: crossPath(centre, middle) }];
  // Upright and of the height that the tests chart draws it.
  if (role === 'smallest') return [{ kind: 'path', role, d: `M${centre},${middle - 6}V${middle + 6}` }];
  const line: Mark = { kind: 'path', role, d: `M${left},${middle}H${right}` };
  if (role !== 'bound') return [line];
  const frame = { left, right, top, bottom: top + SAMPLE.height };
  const hatch = hatchEdge(
    [
      [left, middle],
      [right, middle]
    ],
    'above',
    frame
  );
  return [{ kind: 'path', role: 'hatch', d: hatch }, line];
}
