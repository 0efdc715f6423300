import type { Diagnosis, Interval, TestResult } from '$lib/stats/types';
import { explanationLines } from './exports/explanation-lines';
import type { DriftPart } from '$lib/stats/drift/types';
import { csvTable, type CsvValue } from './exports/csv-table';

/**
 * Every number of a diagnosis document as a CSV file, one a line: `part,item,count,value,low,high`. Numbers are
 * written in full, as in the JSON, so that both files hold the same values; a value that is not there is left empty.
 * Lines end in CR LF, as RFC 4180 has it.
 */
export function documentCsv(document: Diagnosis): string {
  const { data, engine, answer, moments, fit, tests, flags } = document;
  const lines: CsvValue[][] = [['part', 'item', 'count', 'value', 'low', 'high']];
  const one: One = (part, item, value, count = null) => {
    lines.push([part, item, count, value, null, null]);
  };
  const ranged: Ranged = (part, item, { value, low, high }, count = null) => {
    lines.push([part, item, count, value, low, high]);
  };
  one('document', 'format', document.format);
  for (const key of ['version', 'seed', 'resamples', 'alpha', 'tolerance'] as const)
    one('engine', key, engine[key]);
  for (const key of ['digest', 'shots', 'trials', 'unit', 'geometry', 'misread', 'batches'] as const)
    one('data', key, data[key]);
  if (data.misreadUncertainty) one('data', 'misreadUncertainty', data.misreadUncertainty);
  for (const key of ['verdict', 'smallestExcess', 'shotsToDecide'] as const) one('answer', key, answer[key]);
  for (const key of ['mean', 'variance', 'third', 'fourth', 'fano', 'dispersion'] as const)
    ranged('moments', key, moments[key]);
  for (const key of ['ceiling', 'criticalTrials', 'pairCovariance'] as const)
    one('moments', key, moments[key]);
  const { misread, drift, pairs, emptyAside, trials, lumped } = document.nuisances ?? {};
  if (misread) {
    one('misreads', 'applied', misread.applied ? 'yes' : 'no');
    for (const key of ['rate', 'ceiling', 'rawCeiling', 'rawDispersion'] as const)
      one('misreads', key, misread[key]);
    ranged('misreads', 'neededRate', misread.neededRate);
    if (misread.largestRate !== undefined) one('misreads', 'largestRate', misread.largestRate);
    for (const { rate, ceiling, dispersion, verdict } of misread.spread?.rates ?? []) {
      one(`misread rate ${rate}`, 'verdict', verdict);
      one(`misread rate ${rate}`, 'ceiling', ceiling);
      ranged(`misread rate ${rate}`, 'dispersion', dispersion);
    }
    for (const { p, trials } of misread.kinks ?? []) one('misreads', `kinks of the next ${trials} bonds`, p);
  }
  if (lumped)
    for (const key of ['mean', 'variance'] as const)
      ranged('whatever the lumps hide', key, { value: null, ...lumped[key] });
  if (drift) driftLines(drift, one, ranged);
  for (const { trials: n, ceiling, dispersion } of trials?.points ?? []) {
    one(`N ${n ?? 'unknown'}`, 'ceiling', ceiling);
    ranged(`N ${n ?? 'unknown'}`, 'dispersion', dispersion);
  }
  if (emptyAside) {
    ranged('without empty shots', 'dispersion', emptyAside.dispersion);
    for (const key of ['shots', 'mean', 'ceiling', 'p', 'smallestP', 'verdict'] as const)
      one('without empty shots', key, emptyAside[key]);
    for (const test of emptyAside.tests) testLines(`without empty shots, test ${test.id}`, test, one);
  }
  if (pairs) {
    one('pairs', 'proposed', pairs.proposed ? 'yes' : 'no');
    one('pairs', 'logChance', pairs.logChance);
    if (pairs.odd)
      for (const key of ['share', 'faultyShots', 'faultyBonds'] as const)
        ranged('odd counts', key, pairs.odd[key]);
  }
  for (const key of [
    'logLikelihood',
    'divergence',
    'floor',
    'gSquared',
    'poissonPart',
    'shotsToNotice'
  ] as const)
    one('fit', key, fit[key]);
  ranged('fit', 'divergenceCorrected', fit.divergenceInterval);
  for (const { p, trials } of fit.levels) one('fit', `level of ${trials} trials`, p);
  for (const { id, logLikelihood, divergence, aic } of fit.references) {
    one(`law ${id}`, 'logLikelihood', logLikelihood);
    one(`law ${id}`, 'divergence', divergence);
    one(`law ${id}`, 'aic', aic);
  }
  for (const test of tests) testLines(`test ${test.id}`, test, one);
  for (const flag of flags) one('flag', flag.id, flag.grade);
  lines.push(...explanationLines(document.explanations, engine.alpha));
  for (const point of document.distribution) {
    one('distribution', 'shots', point.shots, point.count);
    ranged('distribution', 'observed', { ...point, value: point.observed }, point.count);
    one('distribution', 'fitted', point.fitted, point.count);
  }
  for (const key of ['horizon', 'silence', 'scale'] as const) one('rate', key, document.rate[key]);
  for (const point of document.rate.points) {
    ranged('rate', 'empirical', { ...point, value: point.empirical }, point.count);
    for (const key of ['fitted', 'limit', 'gaussian'] as const) one('rate', key, point[key], point.count);
  }
  const { certificate } = document.tails;
  if (certificate)
    for (const key of ['p', 'side', 'thresholds', 'bound', 'shots', 'mean'] as const)
      one('certificate', key, certificate[key], certificate.count);
  for (const point of document.tails.points) {
    ranged(`${point.side} tail`, 'observed', { ...point, value: point.observed }, point.count);
    for (const key of ['fitted', 'chernoff', 'meanChernoff', 'hoeffding'] as const)
      one(`${point.side} tail`, key, point[key], point.count);
  }
  return csvTable(lines);
}

type One = (part: string, item: string, value: CsvValue, count?: number | null) => void;
type Ranged = (part: string, item: string, interval: Interval, count?: number | null) => void;

function testLines(part: string, test: TestResult, one: One): void {
  for (const key of ['statistic', 'p', 'pAdjusted', 'smallestP', 'resamples'] as const)
    one(part, key, test[key]);
}

/** Shots and batches are told in `item`: `count` is for counts of defects. */
function driftLines({ means, change, split }: DriftPart, one: One, ranged: Ranged): void {
  for (const { from, to, mean, low, high } of means)
    ranged('mean over time', `shots ${from + 1} to ${to}, with three-sigma limits`, {
      value: mean,
      low,
      high
    });
  if (change)
    for (const key of ['shot', 'before', 'after', 'p', 'smallestP'] as const)
      one('change of the mean', key, change[key]);
  if (!split) return;
  one('batches', 'verdict within', split.verdict);
  for (const key of ['dispersion', 'excessWithin', 'meansVariance'] as const)
    ranged('batches', key, split[key]);
  for (const key of ['excess', 'excessBetween', 'p', 'pTogether', 'smallestP', 'tested'] as const)
    one('batches', key, split[key]);
  if (split.order) {
    one('batches', 'correlation of neighbouring shots', split.order.correlation);
    one('batches', 'p of that correlation', split.order.p);
    ranged('batches', 'dispersion from shot to shot', split.order.dispersion);
  }
  for (const line of split.each)
    for (const key of ['shots', 'mean', 'dispersion', 'p'] as const)
      one(`batch ${line.batch}`, key, line[key]);
}
