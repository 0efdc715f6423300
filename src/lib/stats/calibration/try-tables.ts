import { judgeCumulants } from '../cumulants-only/judge-cumulants';
import { generator } from '../random/generator';
import { printedTable, type TableTruth } from './printed-tables';
import { share, type Share } from './share';

/** Share of printed tables of one truth that are called outside at 5 %, and ruled out at 1 %. */
export interface TriedTables {
  alarms: Share;
  ruledOut: Share;
}

/** Judges `repeats` printed tables of one truth: false alarms under independent trials, power otherwise. */
export function tryTables(
  truth: TableTruth,
  asked: { shots: number; trials: number | null; order: number; repeats: number; seed: number }
): TriedTables {
  const { shots, trials, order, repeats, seed } = asked;
  let [alarms, ruledOut] = [0, 0];
  for (let repeat = 0; repeat < repeats; repeat++) {
    const found = judgeCumulants(printedTable(truth, generator(seed, repeat), shots, trials, order));
    if (found.p <= 0.05) alarms++;
    if (found.verdict === 'ruled-out') ruledOut++;
  }
  return { alarms: share(alarms, repeats), ruledOut: share(ruledOut, repeats) };
}
