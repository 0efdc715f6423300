import { floorChance } from './floor-chance';
import { normalInterval } from './normal-interval';
import { quenchExponent } from './quench-exponent';
import { readSweep } from './read-sweep';
import { steadyReports } from './steady-reports';
import { sweepLaws } from './sweep-laws';
import { sweepWords } from './sweep-words';
import type { MixedCondition, SweepOptions, SweepReport, SweptPoint } from './types';
import { windowExponents } from './window-exponents';

/**
 * The document of a sweep from what it keeps of its datasets: so a window is moved without the counts, and says to the last
 * digit what the counts would say.
 *
 * @param given points with their covariances
 * @param mixed conditions that differ between the datasets
 * @throws BadInput as readSweep; RangeError for d, ν or z that are not positive, or for points without covariances
 */
export function refitSweep(
  given: Omit<SweptPoint, 'inWindow'>[],
  options: SweepOptions,
  mixed: MixedCondition[] = []
): SweepReport {
  const sorted = readSweep(given, options);
  const window = options.window ?? { from: sorted[0].time, to: sorted[sorted.length - 1].time };
  const points = sorted.map((one): SweptPoint => {
    const { label, time, shots, ...more } = one;
    const inWindow = time >= window.from && time <= window.to;
    // Points of a document say of another window whether they are inside.
    return { ...{ label, time, shots, inWindow }, ...more, inWindow };
  });
  const held = points.filter(({ inWindow, cumulants }) => inWindow && cumulants !== null);
  const known = held.map(({ label, shots, cumulants, covariance }) => {
    if (!covariance) throw new RangeError(`no covariance of ${label}`);
    const [mean, variance, third] = cumulants!.map(({ value }) => value);
    return { shots, cumulants: [mean, variance, third] as [number, number, number], covariance };
  });
  const fitted = known.map(({ cumulants, covariance }, i) => ({
    logTime: Math.log(held[i].time),
    values: [...cumulants],
    covariance
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
    ...(mixed.length > 0 && { mixed }),
    laws,
    expected: expectedOf(options, laws),
    steady: steadyReports(known, options),
    windows: windowExponents(fitted).map(({ from, to, exponent, error, commonP, fitP, awayP }) => ({
      from: held[from].time,
      to: held[to].time,
      exponent: normalInterval(exponent, error),
      commonP: floorChance(commonP),
      lawP: floorChance(fitP),
      awayP: floorChance(awayP)
    }))
  };
  return { ...report, ...sweepWords(report) };
}

function expectedOf({ transition }: SweepOptions, laws: SweepReport['laws']): SweepReport['expected'] {
  if (!transition) return null;
  const { dimension, correlation, dynamic } = transition;
  const exponent = quenchExponent(dimension, correlation, dynamic);
  const interval = laws?.common.exponent;
  const inside = interval ? interval.low <= exponent && exponent <= interval.high : null;
  return { dimension, correlation, dynamic, exponent, inside };
}
