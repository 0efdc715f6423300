import type { Window } from '../laws/window';
import { logChoose } from '../numerics/log-choose';
import type { KeptCounts } from './truncated-law';
import { windowMoments } from './window-moments';

/**
 * Equal trials of which only the counts kept are left, with a given mean: the most dispersed of all independent trials
 * so cut. Any other such law f has f_n/C(N, n) log-concave (Newton), so ln(f_n/b_n) is concave for every binomial b; a
 * cut leaves that as it is. Of the same mean, f then crosses b twice at most, from below, which makes it less spread in
 * the convex order: its variance, and the mean of every convex function, are at most those of b.
 *
 * @param mean of the counts kept; moved inside their range
 * @returns pmf on the counts kept, scale 1
 * Source: Whitt 1985, J. Appl. Prob. 22:619 (relative log-concavity and the convex order) (m).
 */
export function keptEqual(trials: number, kept: KeptCounts, mean: number): Window {
  const last = Math.min(trials, kept.to);
  const logs = Float64Array.from({ length: last - kept.from + 1 }, (_, i) =>
    logChoose(trials, kept.from + i)
  );
  const window: Window = { first: kept.from, values: new Float64Array(logs.length), scale: 1 };
  const tiltBy = (logit: number): number => {
    let most = -Infinity;
    for (let i = 0; i < logs.length; i++) most = Math.max(most, logs[i] + logit * i);
    let sum = 0;
    for (let i = 0; i < logs.length; i++) sum += window.values[i] = Math.exp(logs[i] + logit * i - most);
    for (let i = 0; i < logs.length; i++) window.values[i] /= sum;
    return windowMoments(window).mean;
  };
  const room = 1e-9 * (last - kept.from);
  const wanted = Math.min(last - room, Math.max(kept.from + room, mean));
  let low = -60;
  let high = 60;
  let logit = Math.log((wanted + 0.5) / (trials - wanted + 0.5));
  // Newton, the slope being the variance; bisection where it would leave the bracket.
  for (let step = 0; step < 200; step++) {
    const off = tiltBy(logit) - wanted;
    if (Math.abs(off) <= 1e-12 * (1 + wanted)) break;
    if (off > 0) high = logit;
    else low = logit;
    const next = logit - off / windowMoments(window).variance;
    logit = next > low && next < high ? next : (low + high) / 2;
  }
  return window;
}
