import { planGrid } from '$lib/stats/calibration/plan-grid';
import { tableTruths } from '$lib/stats/calibration/printed-tables';
import type { Share } from '$lib/stats/calibration/share';
import { tryPlan } from '$lib/stats/calibration/try-plan';
import { tryTables } from '$lib/stats/calibration/try-tables';
import { table } from '../shared/table';

const points = (share: number): string => (100 * share).toFixed(1);

/** Every plan of the grid beside its simulated power: how many are off by more than five points, and the worst ten. */
export function reportPlans(seed: number): string {
  const rows: { off: number; cells: string[] }[] = [];
  const left = { none: 0, rough: 0, large: 0 };
  for (const plan of planGrid()) {
    const found = tryPlan(plan, seed, 1e5);
    if (typeof found === 'string') {
      left[found]++;
      continue;
    }
    const { kind, size, mean, trials } = plan.effect;
    const what = `${kind} ${Number(size.toPrecision(3))}, mean ${Number(mean.toPrecision(3))} of ${trials ?? 'unknown'}`;
    const limits = `${points(found.low)} to ${points(found.high)}`;
    const sharp = [String(plan.alpha), String(plan.power), String(found.shots)];
    rows.push({ off: Math.abs(found.off), cells: [what, ...sharp, points(found.off), limits] });
  }
  rows.sort((a, b) => b.off - a.off);
  const beyond = rows.filter(({ off }) => off > 0.05).length;
  return (
    `Simulated less planned power, in points: ${rows.length} plans, ${beyond} off by more than 5. ` +
    `Left out: ${left.rough} called rough, ${left.none} without a plan, ${left.large} of more than 100000 shots.\n` +
    table(
      ['worst', 'level', 'power', 'shots', 'off', '95 %'],
      rows.slice(0, 10).map(({ cells }) => cells)
    )
  );
}

/** Printed tables of known causes, judged: false alarms at nominal 5 and 1 % under independent trials, and power. */
export function reportPrinted(seed: number, repeats: number): string {
  const percent = ({ share, low, high }: Share): string =>
    share === null ? '' : `${points(share)} (${points(low)}–${points(high)})`;
  const rows = tableTruths.flatMap((truth) =>
    [500, 5000].flatMap((shots) =>
      [truth.trials, null].flatMap((trials) =>
        [2, 3, 4].map((order) => {
          const { alarms, ruledOut } = tryTables(truth, { shots, trials, order, repeats, seed });
          const known = trials === null ? 'unknown' : String(trials);
          return [truth.id, String(shots), known, String(order), percent(alarms), percent(ruledOut)];
        })
      )
    )
  );
  return (
    `Printed cumulants with errors by jackknife, judged ${repeats} times each, in per cent\n` +
    table(['shots of', 'shots', 'N told', 'cumulants', 'p ≤ 0.05', 'ruled out at 1 %'], rows)
  );
}
