import { lawWindow } from '$lib/stats/laws/law-window';
import { bestLaw } from '$lib/stats/fit/best-law';
import { refit } from '$lib/stats/fit/refit';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { generator } from '$lib/stats/random/generator';
import { redraw } from '$lib/stats/resampling/redraw';
import { medianOfSeven } from './cpu';
import type { RefitCase } from './refit-case';

/** What fit and refits of one case took and reached. */
export interface RefitTimes {
  fitSeconds: number;
  refitSeconds: number;
  refits: number;
  /** Of refits with a known best: how many lie within 1e-3 nats of it, and the largest distance. */
  close: number | null;
  furthest: number | null;
}

const refits = 199;

/** Fits the observed histogram and refits 199 resampled ones, as every diagnosis does. */
export function timeRefits({ observed, resampled }: RefitCase): RefitTimes {
  const { levels } = bestLaw(observed);
  const source = redraw(lawWindow(toLaw(levels), 1e-18, 1), observed, observed.total);
  const drawn =
    resampled?.map(({ data }) => data) ??
    Array.from({ length: refits }, (_, b) => source.draw(generator(1, b)));
  const short = resampled?.map(({ data, best }) => best - refit(data, levels).logLikelihood) ?? null;
  return {
    fitSeconds: medianOfSeven(() => bestLaw(observed)),
    refitSeconds: medianOfSeven(() => drawn.forEach((data) => refit(data, levels))) / drawn.length,
    refits: drawn.length,
    close: short && short.filter((nats) => nats <= 1e-3).length,
    furthest: short && Math.max(...short)
  };
}
