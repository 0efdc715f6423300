import type { PName } from '$lib/stats/calibration/outcome';
import { share, type Share } from '$lib/stats/calibration/share';
import type { Summary } from '$lib/stats/calibration/summary';
import { table } from '../shared/table';

const tests: [name: PName, head: string][] = [
  ['ceiling', 'ceiling'],
  ['fit', 'fit'],
  ['high-tail', 'high'],
  ['low-tail', 'low'],
  ['parity', 'parity'],
  ['empty-shots', 'empty'],
  ['batches', 'batches'],
  ['order', 'order'],
  ['certificate', 'cert.'],
  ['within-batches', 'within'],
  ['empty-aside', 'not empty']
];

/** Shares in per cent, one line a setting; "!" where the exact interval of a false alarm lies above the limit. */
export function reportTruths(summaries: Summary[]): string {
  const ran = tests.filter(([name]) => summaries.some(({ alarms }) => alarms[name]));
  const head = ['truth', 'shots', 'repeats', ...ran.map(([, title]) => title), 'ruled out at 1 %', 'at 5 %'];
  head.push('compatible', 'flagged', 'holds mean', 'variance', 'third', 'fourth', 'dispersion');
  return table(
    head,
    summaries.map(({ setting, shots, repeats, alarms, ruledOut, compatible, flagged, coverage }) => [
      setting,
      String(shots),
      String(repeats),
      ...ran.map(([name]) => percent(alarms[name], 0.07)),
      percent(ruledOut['0.01'], 0.01),
      percent(ruledOut['0.05'], 0.05),
      percent(compatible),
      percent(flagged),
      ...(coverage
        ? [coverage.mean, coverage.variance, coverage.third, coverage.fourth, coverage.dispersion].map(
            (one) => percent(one)
          )
        : Array<string>(5).fill(''))
    ])
  );
}

/** Power in per cent, one line a violation and strength. */
export function reportViolations(summaries: Summary[]): string {
  const ran = tests.filter(([name]) => summaries.some(({ alarms }) => alarms[name]));
  const head = ['violation', 'shots', 'repeats', ...ran.map(([, title]) => title)];
  head.push('ruled out at 1 %', 'at 5 %', 'compatible', 'undecided');
  return table(
    head,
    summaries.map(({ setting, shots, repeats, alarms, ruledOut, compatible, undecided }) => [
      setting,
      String(shots),
      String(repeats),
      ...ran.map(([name]) => percent(alarms[name])),
      percent(ruledOut['0.01']),
      percent(ruledOut['0.05']),
      percent(compatible),
      percent(undecided)
    ])
  );
}

/** All repeats of all settings together: the sharpest figure for each test. */
export function reportTogether(summaries: Summary[]): string {
  return table(
    ['test', 'alarms', 'of', 'share', '95 % interval', 'highest of one setting'],
    tests.flatMap(([name]) => {
      const shares = summaries.map(({ alarms, setting, shots }) => ({ of: alarms[name], setting, shots }));
      const ran = shares.filter((one): one is typeof one & { of: Share } => one.of !== undefined);
      if (ran.length === 0) return [];
      const hits = ran.reduce((sum, { of }) => sum + of.hits, 0);
      const total = ran.reduce((sum, { of }) => sum + of.of, 0);
      const worst = ran.reduce((a, b) => (b.of.share! > a.of.share! ? b : a));
      const all = share(hits, total);
      const interval = `${(100 * all.low).toFixed(2)} to ${(100 * all.high).toFixed(2)}`;
      const most = `${percent(worst.of)} of ${worst.of.of}, ${worst.setting}, ${worst.shots} shots`;
      return [[name, String(hits), String(total), (100 * all.share!).toFixed(2), interval, most]];
    })
  );
}

function percent(of: Share | undefined, limit = Infinity): string {
  if (!of || of.share === null) return '-';
  return `${(100 * of.share).toFixed(1)}${of.low > limit ? '!' : ''}`;
}
