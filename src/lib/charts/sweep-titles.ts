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

/** Whether the exponent stays where it is when the window shrinks: judged by intervals that exclude the whole's value. */
export function windowsTitle({ windows, laws }: Pick<SweepReport, 'windows' | 'laws'>): string {
  const whole = laws?.common.exponent.value;
  if (whole === undefined) return 'The exponent window by window';
  const away = windows.filter(({ exponent }) => exponent.low > whole || exponent.high < whole).length;
  if (away === 0) return 'The exponent stays within its interval whichever window is taken';
  return `The exponent moves with the window: ${away} of ${windows.length} windows exclude ${formatNumber(whole)}`;
}
