import { diagnose } from '$lib/stats/diagnose';
import { defaultOptions } from '$lib/stats/default-options';
import { bestLaw } from '$lib/stats/fit/best-law';
import { isReadChain } from '$lib/stats/misread/read-chain';
import type { DrawHelper } from '$lib/stats/resampling/draw-helper';
import { divergencesKept, fittedDraws, type FittedJob } from '$lib/stats/resampling/fitted-draws';
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
  // The clock of the engine runs two hundred times as fast, so that help is worth it in a short test.
  const start = Date.now();
  beforeEach(() => {
    const real = Date.now.bind(Date);
    vi.spyOn(Date, 'now').mockImplementation(() => start + 200 * (real() - start));
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
    expect(asked.length).toBeGreaterThan(data === doubtful ? 100 : 0);
    // Nothing is lent twice.
    expect(new Set(asked).size).toBe(asked.length);
  });

  it('at every rate of an uncertain misread rate, and is the same to the byte', async () => {
    const options = {
      ...defaultOptions,
      trials: 12,
      resamples: 499,
      geometry: 'open-bonds' as const,
      misread: 0.01,
      misreadUncertainty: 0.002
    };
    const { helper } = faithful();
    const rates = new Set<number>();
    const spied: DrawHelper = {
      answers: (job, range) => {
        if (isReadChain(job.levels)) rates.add(job.levels.rate);
        return helper.answers(job, range);
      }
    };
    const alone = await diagnose(doubtful, options);
    const together = await diagnose(doubtful, options, undefined, undefined, spied);
    expect(JSON.stringify(together)).toBe(JSON.stringify(alone));
    const { low, high } = alone.nuisances!.misread!.spread!;
    expect([...rates]).toEqual(expect.arrayContaining([0.01, low, high]));
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

  const all = 2 ** fittedDraws(job).questions.length - 1;
  const breathe = () => Promise.resolve();

  /** Draws `count` of `end` draws, each of which takes so many milliseconds of a clock that nothing else moves. */
  async function drawn(count: number, end: number, milliseconds: (b: number) => number): Promise<number> {
    let now = 1e12;
    vi.spyOn(Date, 'now').mockImplementation(() => now);
    const spy = vi.fn<DrawHelper['answers']>(() => new Promise(() => undefined));
    const shared = new SharedDraws(fittedDraws(job), job, end, { answers: spy });
    for (let b = 0; b < count && spy.mock.calls.length === 0; b++) {
      await shared.answer(b, all, b / end, breathe);
      now += milliseconds(b);
    }
    vi.restoreAllMocks();
    return spy.mock.calls[0]?.[1].from ?? -1;
  }

  it('asks no helper where the rest takes less than a thread needs to start', async () => {
    // 100 ms for those that are refitted whole, and 90 for all others.
    expect(await drawn(1999, 1999, (b) => (b < divergencesKept ? 0.67 : 0.05))).toBe(-1);
  });

  it('asks once it has seen how long the later draws take, or at once where the first take long', async () => {
    const middle = await drawn(1999, 1999, () => 0.5);
    expect(middle).toBeGreaterThan(divergencesKept);
    expect(middle).toBeLessThan(divergencesKept + 150);
    expect(await drawn(1999, 1999, () => 5)).toBeLessThan(60);
  });
});
