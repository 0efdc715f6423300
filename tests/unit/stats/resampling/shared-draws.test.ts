import { diagnose } from '$lib/stats/diagnose';
import { defaultOptions } from '$lib/stats/default-options';
import { bestLaw } from '$lib/stats/fit/best-law';
import type { DrawHelper } from '$lib/stats/resampling/draw-helper';
import { fittedDraws, type FittedJob } from '$lib/stats/resampling/fitted-draws';
import { rangeAnswerer } from '$lib/stats/resampling/range-answerer';
import { SharedDraws } from '$lib/stats/resampling/shared-draws';
import type { CountData } from '$lib/stats/types';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { dataOf } from '../fit/plain';

/** Answers as another thread would, through clones of all that is sent; counts what it was asked. */
function faithful() {
  const answer = rangeAnswerer();
  let known: FittedJob | null = null;
  const asked: number[] = [];
  const helper: DrawHelper = {
    async answers(job, range) {
      for (let b = range.from; b < range.to; b++) asked.push(b);
      await new Promise((resolve) => setTimeout(resolve, 1));
      const request = structuredClone({ job: job === known ? null : job, range });
      known = job;
      return structuredClone(answer(request));
    }
  };
  return { helper, asked };
}

const shots = [30, 200, 500, 600, 400, 180, 66, 16, 3];
const typical: CountData = { kind: 'histogram', counts: shots.map((h, n) => [n, h]), lump: null };
// A burst that leaves the high tail open: every draw is wanted.
const doubtful: CountData = {
  kind: 'histogram',
  counts: [...shots.map((h, n): [number, number] => [n, h]), [10, 3]],
  lump: null
};
const inOrder: CountData = {
  kind: 'shots',
  shots: Array.from({ length: 600 }, (_, i) => (i * i * 7 + 3 * i) % 5),
  batches: null
};

describe('a diagnosis with a helper', () => {
  // The clock of the engine runs ten times as fast, so that help is worth it in a short test.
  const start = Date.now();
  beforeEach(() => {
    const real = Date.now.bind(Date);
    vi.spyOn(Date, 'now').mockImplementation(() => start + 10 * (real() - start));
  });
  afterEach(() => vi.restoreAllMocks());

  it.each([
    ['that stops early', typical, 12, 999],
    ['that takes all draws', doubtful, 12, 999],
    ['of shots in order', inOrder, 6, 999]
  ] as const)('%s is the same to the byte', async (_, data, trials, resamples) => {
    const options = { ...defaultOptions, trials, resamples };
    const { helper, asked } = faithful();
    const alone = JSON.stringify(await diagnose(data, options));
    const together = JSON.stringify(await diagnose(data, options, undefined, undefined, helper));
    expect(together).toBe(alone);
    if (data === doubtful) expect(asked.length).toBeGreaterThan(100);
    // Nothing is lent twice.
    expect(new Set(asked).size).toBe(asked.length);
  });

  it.each([
    ['rejects', () => Promise.reject(new Error('dead'))],
    [
      'throws',
      () => {
        throw new Error('cannot start');
      }
    ],
    ['never answers', () => new Promise<never>(() => undefined)],
    ['answers too little', () => Promise.resolve([])]
  ] as const)('that %s loses nothing', async (_, answers) => {
    const options = { ...defaultOptions, trials: 12, resamples: 499 };
    const alone = JSON.stringify(await diagnose(doubtful, options));
    const spy = vi.fn<DrawHelper['answers']>(answers);
    expect(JSON.stringify(await diagnose(doubtful, options, undefined, undefined, { answers: spy }))).toBe(
      alone
    );
    expect(spy).toHaveBeenCalled();
  });

  it('is cancelled while the helper is at work', async () => {
    const abort = new AbortController();
    const helper: DrawHelper = {
      answers: () => {
        abort.abort(new Error('stop'));
        return new Promise(() => undefined);
      }
    };
    const options = { ...defaultOptions, trials: 12, resamples: 1999 };
    await expect(diagnose(doubtful, options, undefined, abort.signal, helper)).rejects.toThrow('stop');
  });
});

describe('SharedDraws', () => {
  const data = dataOf({ shots, trials: 12 });
  const { levels, logLikelihood } = bestLaw(data);
  const job: FittedJob = { data, levels, logLikelihood, seed: 9 };

  it('asks no helper before it has been drawing for a while', async () => {
    const spy = vi.fn<DrawHelper['answers']>(() => Promise.reject(new Error('not yet')));
    const shared = new SharedDraws(fittedDraws(job), job, 40, { answers: spy });
    const breathe = () => Promise.resolve();
    const frozen = Date.now();
    vi.spyOn(Date, 'now').mockReturnValue(frozen + 90);
    for (let b = 0; b < 40; b++) await shared.answer(b, 1, b / 40, breathe);
    expect(spy).not.toHaveBeenCalled();
    vi.restoreAllMocks();
  });
});
