import type { Diagnosis, RatePoint } from '$lib/stats/types';
import { scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis } from './axis-marks';
import { countTicks } from './count-ticks';
import { frameOf } from './frame-of';
import { groupCounts } from './group-counts';
import { horizonMarks } from './horizon-marks';
import { legendOfDrawn } from './legend-of-drawn';
import { legendOfStanding } from './legend-of-standing';
import { linePath } from './line-path';
import type { Mark, Picture, Point, Size } from './picture';
import { ratePoints } from './rate-points';
import { rateWords } from './rate-words';
import { roomyTicks } from './roomy-ticks';
import { scaledTexts } from './scaled-texts';
import { shownSpan } from './shown-span';
import { thinnedNote } from './thinned-marks';

/** Rate function: seen rates with intervals, finite-N law, its limit, the Gaussian, and the shot horizon. */
export function ratePicture(diagnosis: Diagnosis, { width, text }: Size): Picture {
  const { rate, data } = diagnosis;
  const top = highestRate(diagnosis);
  const [from, to] = shownSpan(
    rate.points,
    (point) => point.empirical !== null || (point.fitted !== null && point.fitted <= top * 0.9)
  );
  const points = rate.points.filter((point) => point.count >= from && point.count <= to);
  const height = Math.min(460, Math.max(280, width * 0.58));
  const frame = frameOf(width, height, {
    left: text * 4.4,
    right: text * 1.8,
    top: text * 2.2,
    bottom: text * 3.8
  });
  // Densities when N is known; a count n lies at n/N, so one scale serves both.
  const perCount = data.trials === null ? 1 : 1 / (data.unit === 'pair' ? data.trials / 2 : data.trials);
  const x = scaleLinear([(from - 0.6) * perCount, (to + 0.6) * perCount], [frame.left, frame.right]);
  const y = scaleLinear([0, top], [frame.bottom, frame.top]);
  const at = (point: RatePoint): number => x(point.count * perCount);
  const curve = (pick: (point: RatePoint) => number | null): string =>
    linePath(
      points.map((point): Point | null => lifted(at(point), pick(point), y)),
      frame
    );

  const groups = groupCounts(points, x(perCount) - x(0), 5);
  const rates = y.ticks(5);
  const { texts, exponent } = scaledTexts(rates);
  const horizon = horizonMarks(diagnosis, points, at, y, frame, text);
  const marks: Mark[] = [
    ...horizon.filter((mark) => mark.kind === 'path'),
    ...leftAxis(
      frame,
      rates.map((v, i) => ({ at: y(v), text: texts[i] })),
      rateTitle(diagnosis),
      text,
      exponent
    ),
    { kind: 'path', role: 'gaussian', d: curve((point) => point.gaussian) },
    { kind: 'path', role: 'limit', d: curve((point) => point.limit) },
    { kind: 'path', role: 'fitted', d: curve((point) => point.fitted) },
    ...ratePoints(groups, at, y, frame),
    ...horizon.filter((mark) => mark.kind === 'text'),
    ...bottomAxis(
      frame,
      data.trials === null ? countTicks(x, text) : roomyTicks(x, text),
      densityTitle(diagnosis),
      text
    )
  ];
  return {
    width,
    height,
    build: 'field',
    marks,
    legend: legendOfDrawn(marks, [
      { role: 'observed', label: 'seen, with its 95 % interval' },
      ...legendOfStanding(marks, 'seen'),
      { role: 'unseen', label: 'never seen: lower limit only' },
      { role: 'fitted', label: 'best law at this N' },
      { role: 'limit', label: 'its large-deviation limit' },
      { role: 'gaussian', label: 'Gaussian' },
      { role: 'shade', label: 'beyond the shot horizon' }
    ]),
    order: 'across',
    readings: points.map((point) => ({
      x: at(point),
      y: y(Math.min(top, point.empirical ?? point.low)),
      words: () => rateWords(point, rate.scale)
    })),
    notes: groups[0].length > 1 ? [thinnedNote(groups[0].length)] : []
  };
}

/** A little above the horizon; with so few shots that the horizon is at 0, whatever is there to draw. */
function highestRate({ rate }: Diagnosis): number {
  if (rate.horizon > 0) return rate.horizon * 1.4;
  const drawn = rate.points.flatMap(({ empirical, low, fitted }) => [empirical ?? 0, low, fitted ?? 0]);
  return Math.max(...drawn.filter(Number.isFinite), 1e-6) * 1.2;
}

const lifted = (x: number, value: number | null, y: (value: number) => number): Point | null =>
  value === null ? null : [x, y(value)];

const rateTitle = ({ rate, data }: Diagnosis): string =>
  data.trials === null || rate.scale === 1 ? 'rate, nats a shot' : 'rate, nats a trial';

const densityTitle = ({ data }: Diagnosis): string =>
  data.trials === null
    ? data.unit === 'pair'
      ? 'pairs of defects in one shot'
      : 'defects in one shot'
    : data.unit === 'pair'
      ? 'pairs a place, n/N'
      : 'defect density, n/N';
