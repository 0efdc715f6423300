import { formatNumber } from '$lib/model/format-number';
import type { DeviceTimeline } from '$lib/model/team/devices/timeline';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { frameOf } from './frame-of';
import { nameTicks } from './name-ticks';
import { observedMarks, type Seen } from './observed-marks';
import type { LegendEntry, Mark, Picture, Role, Size } from './picture';
import { scaledTexts } from './scaled-texts';
import { knownOf, QUANTITIES, type Quantity } from './timeline-quantities';

type Drawn = Pick<DeviceTimeline, 'points' | 'versions' | 'reference'>;

/** One quantity of a group version by version, with 95 % intervals and the limits of the reference version. */
export function timelinePicture(
  { points, versions, reference }: Drawn,
  quantity: Quantity,
  { width, text }: Size
): Picture {
  const height = Math.min(360, Math.max(240, width * 0.42));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  const names = versions.map(({ name }) => name);
  const place = new Map(names.map((name, i) => [name, i]));
  const known = points.flatMap(({ version, shots, ...rest }) => {
    const told = knownOf({ version, shots, ...rest }, quantity);
    return told ? [{ version, shots, at: place.get(version) ?? 0, ...told }] : [];
  });
  const ends = known.flatMap(({ low, high, limits }) => [low, high, ...(limits ?? [])]);
  const [least, most] = ends.length > 0 ? [Math.min(...ends), Math.max(...ends)] : [0, 1];
  const room = (most - least) * 0.08 || Math.abs(most) * 0.1 || 0.5;
  const x = scaleLinear([-0.5, Math.max(1, names.length) - 0.5], [frame.left, frame.right]);
  const y = scaleLinear(
    [Math.max(least - room, least >= 0 ? 0 : -Infinity), most + room],
    [frame.bottom, frame.top]
  );
  const seen = known.map(({ at, value, low, high, limits }): Seen => ({
    at: [x(at), y(value)],
    interval: low < high ? { x: x(at), from: y(low), to: y(high) } : null,
    standing: limits && value > limits[1] ? 'more' : limits && value < limits[0] ? 'fewer' : 'within'
  }));
  const steps = known.flatMap(({ at, limits }) =>
    (limits ?? [])
      .slice(quantity === 'divergence' ? 1 : 0)
      .map((end) => `M${x(at - 0.5).toFixed(2)},${y(end).toFixed(2)}H${x(at + 0.5).toFixed(2)}`)
  );
  const compared = known.find(({ version }) => version === reference);
  const ticks = y.ticks(5);
  const { texts, exponent } = scaledTexts(ticks);
  const marks = observedMarks(seen, 6).filter((mark) => mark.kind === 'path' && mark.d !== '');
  const drawn = (role: Role) => marks.some((mark) => mark.kind === 'path' && mark.role === role);
  const entry = (role: Role, label: string): LegendEntry[] => (drawn(role) ? [{ role, label }] : []);
  const path = (role: Role, d: string): Mark[] => (d ? [{ kind: 'path', role, d }] : []);
  return {
    width,
    height,
    build: 'low-field',
    marks: [
      ...leftAxis(
        frame,
        ticks.map((value, i) => ({ at: y(value), text: texts[i] })),
        QUANTITIES[quantity],
        text,
        exponent
      ),
      ...path(
        'level',
        // Beside the reference and not through it: a line there would look like an interval.
        compared
          ? [compared.at - 0.5, compared.at + 0.5]
              .map((side) => `M${x(side).toFixed(2)},${frame.bottom}V${frame.top}`)
              .join('')
          : ''
      ),
      ...path('limit', steps.join('')),
      ...marks,
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
    legend: [
      ...entry('observed', 'a version, with its 95 % interval'),
      ...entry('observed-more', 'above the limits of the reference'),
      ...entry('observed-fewer', 'below the limits of the reference'),
      ...(steps.length > 0
        ? [{ role: 'limit' as const, label: 'limits that hold 99.73 % of versions like the reference' }]
        : []),
      ...(compared
        ? [{ role: 'level' as const, label: `the reference between them, ${compared.version}` }]
        : [])
    ],
    order: 'across',
    readings: known.map(({ version, shots, at, value, low, high, limits }) => ({
      x: x(at),
      y: y(value),
      words: () =>
        `Version ${version}, ${formatNumber(shots, 6)} shots: ${QUANTITIES[quantity]} ${formatNumber(value)}, 95\u202f% interval ${formatNumber(low)} to ${formatNumber(high)}${limits ? sayLimits(limits, quantity) : ''}${version === reference ? '; the reference' : ''}.`
    })),
    notes: notesOf(names.length - known.length, quantity)
  };
}

function sayLimits([low, high]: [number, number], quantity: Quantity): string {
  return quantity === 'divergence'
    ? `; limit ${formatNumber(high)}`
    : `; limits ${formatNumber(low)} to ${formatNumber(high)}`;
}

function notesOf(missing: number, quantity: Quantity): string[] {
  if (missing <= 0) return [];
  const which = missing === 1 ? 'One version has' : `${missing} versions have`;
  return [
    quantity === 'divergence'
      ? `${which} no diagnosis of this group yet, or no dataset.`
      : `${which} no ${QUANTITIES[quantity]} that is known for this group: see the table of marks.`
  ];
}
