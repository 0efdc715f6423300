import { describe, expect, it } from 'vitest';
import { readDocument } from '$lib/model/read-document';
import { plainText } from '$lib/model/plain-text/plain-text';
import { violations } from '$lib/stats/calibration/violations';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { explain } from '$lib/stats/explanations/explain';
import { generator } from '$lib/stats/random/generator';
import type { CountData } from '$lib/stats/types';

const dead = violations.find(({ id }) => id === 'dead-shots')!;
const data = dead.draw(generator(3, 1), 5000, 0.03);
const options = { ...defaultOptions, trials: dead.trials, resamples: 399 };

describe('explanations of a document', () => {
  it('come with a result that is ruled out, are led by the cause, and pass the schema', async () => {
    const document = await diagnose(data, options);
    expect(document.answer.verdict).toBe('ruled-out');
    const { ranked, tied, notRun } = document.explanations!;
    expect(ranked[0].id).toBe('dead-shots');
    expect(tied).toEqual(['dead-shots']);
    expect(ranked[0].parameter!.low).toBeLessThan(0.03);
    expect(ranked[0].parameter!.high).toBeGreaterThan(0.03);
    expect(ranked.reduce((sum, { weight }) => sum + weight, 0)).toBeCloseTo(1, 12);
    expect(ranked.map(({ behind }) => behind)).toEqual(
      ranked.map(({ behind }) => behind).sort((a, b) => a - b)
    );
    expect(ranked.length + notRun.length).toBeGreaterThanOrEqual(8);
    expect(readDocument(JSON.stringify(document))).toMatchObject({ ok: true });
    expect(plainText(document)).toMatch(/What else it could be\n[\s\S]*described best by dead shots/);
  });

  it('are left out where nothing is ruled out, and such documents pass too', async () => {
    const few: CountData = {
      kind: 'histogram',
      counts: [
        [0, 30],
        [1, 70],
        [2, 60],
        [3, 20]
      ],
      lump: null
    };
    const document = await diagnose(few, { ...options, trials: 12, resamples: 39 });
    expect('explanations' in document).toBe(false);
    expect(readDocument(JSON.stringify(document))).toMatchObject({ ok: true });
  });

  it('are the same bytes on demand for the same seed', async () => {
    const once = JSON.stringify(await explain(data, options));
    expect(JSON.stringify(await explain(data, options))).toBe(once);
    expect(JSON.stringify(await explain(data, { ...options, seed: 2 }))).not.toBe(once);
  });
});
