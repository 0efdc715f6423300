import { formatNumber } from '$lib/model/format-number';
import { KNOWN_LAWS, RATIO_NAMES } from '$lib/model/team/sweeps/ratio-names';
import type { SteadyReport, SweepReport } from '$lib/stats/sweep/types';

/** What the chart of a ratio shows: whether it is the same at every time, and which known laws have it. */
export function ratioTitle(
  { id, steady, p, references }: SteadyReport,
  { alpha }: Pick<SweepReport, 'alpha'>
): string {
  const name = RATIO_NAMES[id];
  if (p !== null && p <= alpha)
    return id === 'pair-factor'
      ? `${name} changes with the hold time`
      : `${name} is not the same at every time`;
  const value = formatNumber(steady.value);
  if (id === 'pair-factor') return `${name} keeps to ${value} within errors`;
  const laws = references.filter(({ inside }) => inside).map((one) => KNOWN_LAWS[one.id] ?? one.id);
  const agreeing =
    laws.length === 0 ? 'none of the known laws has it' : `within reach of ${laws.join(' and of ')}`;
  return `${name} keeps to ${value} within errors: ${agreeing}`;
}
