import { formatNumber } from '$lib/model/format-number';
import type { SweepReport } from '$lib/stats/sweep/types';

/** What the chart of cumulants shows, in one line. */
export function sweepTitle({ laws, alpha }: Pick<SweepReport, 'laws' | 'alpha'>): string {
  if (!laws) return 'No power law can be fitted in this window';
  const { exponent, p } = laws.common;
  if (laws.p !== null && laws.p <= alpha) return 'The cumulants leave power laws in this window';
  if (p <= alpha) return 'The cumulants fall with different exponents';
  return `The cumulants share one exponent, ${formatNumber(exponent.value)}`;
}

/** Whether the exponent stays where it is when the window shrinks, all windows that were looked at allowed for. */
export function windowsTitle({
  windows,
  laws,
  alpha
}: Pick<SweepReport, 'windows' | 'laws' | 'alpha'>): string {
  if (!laws || windows.every(({ awayP }) => awayP === undefined || awayP === null))
    return 'The exponent window by window';
  const away = windows.filter(({ awayP }) => typeof awayP === 'number' && awayP <= alpha).length;
  if (away === 0) return 'The exponent stays within errors whichever window is taken';
  const whole = formatNumber(laws.common.exponent.value);
  return `The exponent moves with the window: away from ${whole} in ${away} of ${windows.length}, all allowed for`;
}
