import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { pairing } from '$lib/stats/flags/pairing';
import { describe, expect, it } from 'vitest';
import { plainPmf } from '../fit/plain';
import { evidence } from '../flags/make-evidence';

// Ordinary causes that the words of an answer must name. Counts are the expected ones of each law, rounded.
const options = { ...defaultOptions, resamples: 199 };

const counted = (law: readonly number[], shots: number): [number, number][] =>
  law.map((f, n): [number, number] => [n, Math.round(shots * f)]).filter(([, h]) => h > 0);

describe('an answer', () => {
  it('on ring kinks as pairs names the ring, which halves the variance of single kinks', async () => {
    // Bernoulli kinks on 64 bonds whose total is even: binomial weights of the even counts.
    const single = plainPmf(new Array<number>(64).fill(0.1));
    const even = single.map((f, n) => (n % 2 === 0 ? f : 0));
    const whole = even.reduce((sum, f) => sum + f, 0);
    const counts = counted(
      even.map((f) => f / whole),
      20_000
    );
    const document = await diagnose(
      { kind: 'histogram', counts, lump: null },
      { ...options, trials: 64, geometry: 'ring-bonds', unit: 'pair' }
    );
    expect(document.moments.dispersion.value).toBeGreaterThan(0.45);
    expect(document.moments.dispersion.value).toBeLessThan(0.55);
    expect(document.answer.statement).toMatch(/single independent kinks on a ring are/);
    const flag = document.flags.find(({ id }) => id === 'regular');
    expect(flag?.otherCauses[0]).toMatch(/the ring itself/);
    expect(document.cautions.join(' ')).toMatch(/The ceiling is that of independent pairs/);
  });

  it('says that a stated misread rate cannot be right', async () => {
    const counts = counted(plainPmf(new Array<number>(100).fill(0.06)), 20_000).map(
      ([n, h]): [number, number] => [n, n > 10 ? 3 * h : h]
    );
    const document = await diagnose(
      { kind: 'histogram', counts, lump: null },
      { ...options, trials: 100, geometry: 'open-bonds', misread: 0.1 }
    );
    // Without misreads, which there are, the tests would rule independent trials out: that answer is not given.
    expect(document.tails.certificate!.p).toBeLessThan(0.01);
    expect(document.answer.verdict).toBe('undecided');
    expect(document.answer.shotsToDecide).toBeNull();
    expect(document.answer.statement).toMatch(
      /cannot be judged with the misread rate that was stated\. It cannot be right: these counts allow 3\.\d+/
    );
    expect(document.answer.because[0]).toMatch(/as they were read, without misreads/);
  });

  it('judges no kinks by tests that could not allow for the misread rate that was stated', async () => {
    // 10 % of the sites misread are more than are allowed for, and a mean of 25 does not refute them.
    const counts = counted(plainPmf(new Array<number>(100).fill(0.25)), 20_000).map(
      ([n, h]): [number, number] => [n, n > 33 ? 3 * h : h]
    );
    const of = (more: Partial<typeof options>) =>
      diagnose(
        { kind: 'histogram', counts, lump: null },
        { ...options, trials: 100, geometry: 'open-bonds', ...more }
      );
    expect((await of({})).answer.verdict).toBe('ruled-out');
    const { answer, cautions } = await of({ misread: 0.1 });
    expect(answer.verdict).toBe('undecided');
    expect(answer.shotsToDecide).toBeNull();
    expect(answer.statement).toMatch(
      /without misreads no independent trials explain them, and the misread rate that was stated could not be allowed for/
    );
    expect(answer.because[0]).toMatch(/as they were read, without misreads/);
    expect(cautions.join(' ')).toMatch(/Above 9\.17\u202f% it is written down but not allowed for/);
    // Sites that are counted themselves stay independent trials.
    expect((await of({ misread: 0.1, geometry: 'sites' })).answer.verdict).toBe('ruled-out');
  });

  it('judges no ring whose odd counts refute every rate, nor one of half sure bonds and an odd number', async () => {
    const ring = (counts: [number, number][], trials: number) =>
      diagnose(
        { kind: 'histogram', counts, lump: null },
        { ...options, trials, geometry: 'ring-bonds', misread: 0.01 }
      );
    const even = counted(plainPmf(new Array<number>(50).fill(0.06)), 20_000).map(
      ([n, h]): [number, number] => [2 * n, h]
    );
    expect((await ring([...even, [3, 1]], 100)).answer.verdict).toBe('undecided');
    // Equal bonds of p = 2/3 on a ring of 5: 0, 2 and 4 kinks as 1 : 40 : 80.
    expect(
      (
        await ring(
          [
            [0, 100],
            [2, 4000],
            [4, 8000]
          ],
          5
        )
      ).answer.verdict
    ).toBe('undecided');
  });

  it('names dead shots beside pairing, since each of them counts as even', () => {
    const even = { seen: 1569, expected: 0.5, oneCountAlone: false };
    const caused = (emptyShots: number) =>
      pairing(evidence({ p: { parity: 0.001, 'empty-shots': emptyShots }, over: { even } }))?.otherCauses;
    expect(caused(0.001)).toContain('dead shots: each of them counts as even');
    expect(caused(0.8)).not.toContain('dead shots: each of them counts as even');
  });

  it('does not tell stories under drift without saying that drift is none of them', async () => {
    const laws = [0.05, 0.1].map((p) => plainPmf(new Array<number>(60).fill(p)));
    const shots = Array.from({ length: 20 }, (_, batch) =>
      counted(laws[batch % 2], 100).flatMap(([count, h]) => new Array<number>(h).fill(count))
    );
    const document = await diagnose(
      {
        kind: 'shots',
        shots: shots.flat(),
        batches: shots.flatMap((batch, i) => batch.map(() => `b${i}`))
      },
      { ...options, trials: 60 }
    );
    expect(document.flags.map(({ id }) => id)).toContain('drift');
    expect(document.explanations?.statement).toMatch(
      /a rate that changed meanwhile, which these shots show, is none of them/
    );
    expect(document.flags.flatMap(({ next }) => next).join(' ')).not.toMatch(/Give the shots in order/);
  });
});
