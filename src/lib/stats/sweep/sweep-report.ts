import { cumulantErrors, type CumulantErrors } from './cumulant-errors';
import type { SweepPoint } from './fit-power-laws';
import { normalInterval } from './normal-interval';
import { quenchExponent } from './quench-exponent';
import { readSweep } from './read-sweep';
import { steadyReports } from './steady-reports';
import { sweepLaws } from './sweep-laws';
import { sweepWords } from './sweep-words';
import type { SweepInput, SweepOptions, SweepReport, SweptPoint } from './types';
import { windowExponents } from './window-exponents';

/**
 * Everything that is told of a sweep over quench or hold time, as one plain document: cumulants with their intervals,
 * power laws in the window and the test of one exponent for all, ratios beside known laws, how the exponent moves with
 * the window, and the answer in words. The same input gives the same bytes; nothing in it is drawn at random.
 *
 * @throws BadInput as readSweep; RangeError for d, ν or z that are not positive
 */
export function sweepReport(inputs: SweepInput[], options: SweepOptions): SweepReport {
  const sorted = readSweep(inputs, options);
  const window = options.window ?? { from: sorted[0].time, to: sorted[sorted.length - 1].time };
  const all = sorted.map((input) => ({ input, known: cumulantErrors(input.counts) }));
  const points = all.map(({ input, known }) => swept(input, known, window));
  const held = all.flatMap(({ input, known }, i) =>
    known && points[i].inWindow ? [{ time: input.time, known }] : []
  );
  const fitted: SweepPoint[] = held.map(({ time, known }) => ({
    logTime: Math.log(time),
    values: [...known.cumulants],
    covariance: known.covariance
  }));
  const laws = sweepLaws(fitted);
  const report = {
    format: 'severalty.sweep/1' as const,
    axis: options.axis,
    timeUnit: options.timeUnit,
    unit: options.unit,
    alpha: options.alpha,
    window,
    points,
    laws,
    expected: expectedOf(options, laws),
    steady: steadyReports(
      held.map(({ known }) => known),
      options
    ),
    windows: windowExponents(fitted).map(({ from, to, exponent, error, commonP, fitP }) => ({
      from: held[from].time,
      to: held[to].time,
      exponent: normalInterval(exponent, error),
      commonP,
      lawP: fitP
    }))
  };
  return { ...report, ...sweepWords(report) };
}

function swept(
  { label, time, counts, dataset }: SweepInput,
  known: CumulantErrors | null,
  { from, to }: { from: number; to: number }
): SweptPoint {
  const shots = counts.reduce((sum, [, seen]) => sum + seen, 0);
  const inWindow = time >= from && time <= to;
  const place = { label, time, shots, inWindow, ...(dataset && { dataset }) };
  if (!known) return { ...place, cumulants: null, ratios: null };
  const { cumulants, covariance: v } = known;
  const interval = (q: number) => normalInterval(cumulants[q], Math.sqrt(v[4 * q]));
  const ratio = (q: number) => {
    const r = cumulants[q] / cumulants[0];
    return normalInterval(r, Math.sqrt(v[4 * q] - 2 * r * v[q] + r * r * v[0]) / cumulants[0]);
  };
  return {
    ...place,
    cumulants: [interval(0), interval(1), interval(2)],
    ratios: [ratio(1), ratio(2)]
  };
}

function expectedOf({ transition }: SweepOptions, laws: SweepReport['laws']): SweepReport['expected'] {
  if (!transition) return null;
  const { dimension, correlation, dynamic } = transition;
  const exponent = quenchExponent(dimension, correlation, dynamic);
  const { low, high } = laws?.common.exponent ?? { low: NaN, high: NaN };
  return { dimension, correlation, dynamic, exponent, inside: low <= exponent && exponent <= high };
}
