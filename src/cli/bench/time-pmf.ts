import { lawWindow } from '$lib/stats/laws/law-window';
import { generator } from '$lib/stats/random/generator';
import type { Law } from '$lib/stats/types';
import { medianOfSeven } from './cpu';

export interface PmfTimes {
  trials: number;
  kind: 'uniform' | 'small';
  /** CPU seconds of the whole pmf, exact down to 1e-300, and of the pmf cut at 1e-18 of its mode. */
  exactSeconds: number;
  cutSeconds: number;
}

/** The full pmf of N different probabilities: uniform on 0 … 1, or with a mean of 20 in all (2 for N = 12). */
export function timePmf(trials: number, kind: PmfTimes['kind']): PmfTimes {
  const random = generator(1000 + trials, 0);
  const p = Array.from({ length: trials }, () => random.next());
  const sum = p.reduce((a, b) => a + b, 0);
  const share = kind === 'small' ? (trials >= 64 ? 20 : 2) / sum : 1;
  const law: Law = { levels: p.map((one) => ({ p: one * share, trials: 1 })), poissonPart: 0 };
  return {
    trials,
    kind,
    exactSeconds: medianOfSeven(() => lawWindow(law)),
    cutSeconds: medianOfSeven(() => lawWindow(law, 1e-18, 1))
  };
}
