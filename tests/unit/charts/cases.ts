import type { Diagnosis } from '$lib/stats/types';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { anyDiagnosis, WELDON } from './any-diagnosis';

/** Counts that are hard to draw, by name. */
export const CASES: [string, () => Promise<Diagnosis>][] = [
  ['Weldon’s dice', () => anyDiagnosis(WELDON, { trials: 12 })],
  ['a closing lump', () => anyDiagnosis(WELDON.slice(0, 10), { trials: 12 }, { from: 10, shots: 18 })],
  [
    'an opening lump',
    () => anyDiagnosis(WELDON.slice(3), { trials: 12 }, null, { to: 2, shots: 185 + 1149 + 3265 })
  ],
  [
    'lumps at both ends',
    () =>
      anyDiagnosis(
        WELDON.slice(3, 8),
        { trials: 12 },
        { from: 8, shots: 403 + 105 + 14 + 4 },
        { to: 2, shots: 185 + 1149 + 3265 }
      )
  ],
  [
    'one count between two lumps, N unknown',
    () => anyDiagnosis([[2, 31]], {}, { from: 3, shots: 40 }, { to: 1, shots: 9 })
  ],
  [
    'lumps at both ends of 500 counts',
    () =>
      anyDiagnosis(
        Array.from({ length: 500 }, (_, i) => [
          700 + i,
          1 + Math.round(40 * Math.exp(-(((i - 250) / 90) ** 2)))
        ]),
        { trials: 100_000 },
        { from: 1200, shots: 12 },
        { to: 699, shots: 10 }
      )
  ],
  [
    'N unknown',
    () =>
      anyDiagnosis([
        [0, 447],
        [1, 132],
        [2, 42],
        [3, 21],
        [4, 3],
        [5, 2]
      ])
  ],
  [
    'shots whose mean jumps',
    () => ofShots(Array.from({ length: 203 }, (_, i) => (i % 3) + (i < 90 ? 0 : 6)))
  ],
  ['ten shots', () => ofShots([0, 1, 2, 1, 0, 1, 900, 1, 0, 1])],
  ['shots all alike', () => ofShots(new Array<number>(60).fill(3))],
  ['one shot', () => anyDiagnosis([[3, 1]], { trials: 12 })],
  ['one count', () => anyDiagnosis([[3, 700]], { trials: 12 })],
  ['only empty shots', () => anyDiagnosis([[0, 40]], { trials: 5 })],
  ['every trial in every shot', () => anyDiagnosis([[5, 40]], { trials: 5 })],
  [
    'one trial',
    () =>
      anyDiagnosis(
        [
          [0, 30],
          [1, 70]
        ],
        { trials: 1 }
      )
  ],
  [
    'pairs',
    () =>
      anyDiagnosis(
        [
          [0, 300],
          [2, 420],
          [4, 210],
          [6, 61],
          [8, 9]
        ],
        { trials: 40, unit: 'pair' }
      )
  ],
  [
    '2^40 shots',
    () =>
      anyDiagnosis(
        [
          [0, 2 ** 38],
          [1, 2 ** 39],
          [2, 2 ** 38]
        ],
        { trials: 2 }
      )
  ],
  [
    'N = 2',
    () =>
      anyDiagnosis(
        [
          [0, 30],
          [1, 50],
          [2, 20]
        ],
        { trials: 2 }
      )
  ],
  [
    'residuals in the hundred thousands',
    () =>
      anyDiagnosis(
        [
          [0, 2 ** 38],
          [1, 2 ** 36],
          [2, 2 ** 39]
        ],
        { trials: 2 }
      )
  ],
  [
    'N = 2000',
    () =>
      anyDiagnosis(
        [
          [900, 30],
          [1000, 50],
          [1100, 20]
        ],
        { trials: 2000 }
      )
  ],
  ['counts to a million', async () => stretched(await anyDiagnosis(WELDON, { trials: 12 }), 83_333)],
  [
    'far counts',
    () =>
      anyDiagnosis(
        [
          [2, 50],
          [900, 1]
        ],
        { trials: 1000 }
      )
  ]
];

/** The same document with every count and N so many times as large: labels are long, and nothing else is odd. */
function stretched(document: Diagnosis, times: number): Diagnosis {
  const { data, distribution, rate, tails } = document;
  const wide = <T extends { count: number }>(points: T[]) =>
    points.map((point) => ({ ...point, count: point.count * times }));
  return {
    ...document,
    data: { ...data, trials: data.trials && data.trials * times },
    distribution: wide(distribution),
    rate: { ...rate, points: wide(rate.points) },
    tails: { ...tails, points: wide(tails.points) }
  };
}

/** A shot list in batches of ten. */
const ofShots = (shots: number[]): Promise<Diagnosis> =>
  diagnose(
    { kind: 'shots', shots, batches: shots.map((_, i) => `run ${Math.floor(i / 10)}`) },
    { ...defaultOptions, resamples: 19 }
  );
