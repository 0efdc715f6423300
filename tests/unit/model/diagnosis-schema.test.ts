import { describe, expect, it } from 'vitest';
import { diagnosisSchema } from '$lib/model/diagnosis-schema';
import { documentText } from '$lib/model/document-text';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData } from '$lib/stats/types';

const options = { ...defaultOptions, resamples: 19 };
const histogram = (
  counts: [number, number][],
  lump: { from: number; shots: number } | null = null
): CountData => ({
  kind: 'histogram',
  counts,
  lump
});

const cases: [string, CountData, Partial<typeof options>][] = [
  [
    'ordinary',
    histogram([
      [0, 30],
      [1, 50],
      [2, 20]
    ]),
    { trials: 12 }
  ],
  [
    'trials unknown',
    histogram([
      [0, 30],
      [1, 50],
      [2, 20]
    ]),
    {}
  ],
  [
    'a lump',
    histogram(
      [
        [0, 30],
        [1, 50]
      ],
      { from: 2, shots: 9 }
    ),
    { trials: 4 }
  ],
  ['all at zero', histogram([[0, 30]]), { trials: 12 }],
  ['all at one count', histogram([[3, 30]]), { trials: 12 }],
  ['all at N', histogram([[4, 30]]), { trials: 4 }],
  ['one shot', { kind: 'shots', shots: [5], batches: null }, {}],
  [
    'batches',
    { kind: 'shots', shots: [1, 2, 3, 2, 1, 5], batches: ['a', 'a', 'b', 'b', 'c', 'c'] },
    { trials: 9, misread: 0.01, geometry: 'open-bonds' }
  ],
  [
    'pairs',
    histogram([
      [0, 5],
      [2, 30],
      [4, 20]
    ]),
    { trials: 12, unit: 'pair', geometry: 'ring-bonds' }
  ],
  [
    'a supplied law',
    histogram([
      [0, 30],
      [1, 50],
      [2, 20]
    ]),
    { trials: 3, supplied: [0.1, 0.3, 0.5] }
  ],
  [
    '2^40 shots',
    histogram([
      [0, 2 ** 39],
      [1, 2 ** 39]
    ]),
    { trials: 1 }
  ]
];

describe('diagnosisSchema', () => {
  it.each(cases)('takes the document of the engine: %s', async (_, data, more) => {
    const document = await diagnose(data, { ...options, ...more });
    const read = JSON.parse(documentText(document)) as unknown;
    expect(diagnosisSchema.parse(read)).toEqual(read);
    // JSON has no NaN and no Infinity: if one were in the document, null would stand in its text.
    expect(read).toEqual(document);
  });

  it('refuses another format, a missing part, an unknown part and numbers that are none', async () => {
    const document = await diagnose(cases[0][1], { ...options, trials: 12 });
    const refused = (change: object) => diagnosisSchema.safeParse({ ...document, ...change }).success;
    expect(refused({})).toBe(true);
    expect(refused({ format: 'severalty.diagnosis/2' })).toBe(false);
    expect(refused({ flags: undefined })).toBe(false);
    expect(refused({ extra: 1 })).toBe(false);
    expect(refused({ moments: { ...document.moments, ceiling: NaN } })).toBe(false);
    expect(refused({ data: { ...document.data, digest: 'sha256:0' } })).toBe(false);
  });
});

it('documentText writes the same bytes for the same input, options and seed', async () => {
  const [first, second] = await Promise.all(
    [1, 2].map(() => diagnose(cases[7][1], { ...options, trials: 9 }))
  );
  expect(documentText(first)).toBe(documentText(second));
  expect(documentText(first).endsWith('}\n')).toBe(true);
});
