import type { Provenance } from '$lib/pdf/report-input';
import type { Diagnosis } from '$lib/stats/types';
import { diagnose } from '$lib/stats/diagnose';
import { defaultOptions } from '$lib/stats/default-options';
import { readKinks } from '../stats/misread/read-kinks';
import { anyDiagnosis, WELDON } from '../charts/any-diagnosis';

export const BLIND: Provenance = {
  madeBy: null,
  madeAt: null,
  team: null,
  dataset: null,
  conditions: null,
  link: null
};

/** Greenwood & Yule 1920, JRSS 83:255: accidents of women in a shell factory. */
const ACCIDENTS: [number, number][] = [447, 132, 42, 21, 3, 2].map((shots, count) => [count, shots]);

/** Invented: only even counts, far too many empty shots, and a shot far out, so that many tests and flags speak. */
const WILD: [number, number][] = [
  [0, 900],
  [2, 300],
  [4, 700],
  [6, 250],
  [12, 40],
  [30, 12]
];

/** Invented: a bell of 2 000 trials. */
const WIDE: [number, number][] = Array.from({ length: 101 }, (_, i) => [
  150 + i,
  Math.round(4000 * Math.exp(-((i - 50) ** 2) / 360)) + 1
]);

/** Invented shots in order, in two batches that differ. */
const inOrder = (): Promise<Diagnosis> =>
  diagnose(
    {
      kind: 'shots',
      shots: Array.from({ length: 120 }, (_, i) => (i % 3) + (i < 60 ? 0 : 2)),
      batches: Array.from({ length: 120 }, (_, i) => (i < 60 ? 'a' : 'b'))
    },
    { ...defaultOptions, trials: 12, resamples: 19 }
  );

/** Documents of every kind that a report can be made of. */
export const DOCUMENTS: [name: string, make: () => Promise<Diagnosis>][] = [
  ['dice', () => anyDiagnosis(WELDON, { trials: 12 })],
  ['a lump', () => anyDiagnosis(WELDON.slice(0, 10), { trials: 12 }, { from: 10, shots: 18 })],
  ['accidents, trials unknown', () => anyDiagnosis(ACCIDENTS, { trials: null })],
  ['accidents, judged', () => anyDiagnosis(ACCIDENTS, { trials: null, resamples: 999 })],
  ['many flags', () => anyDiagnosis(WILD, { trials: 60 })],
  [
    'pairs on a ring',
    () => anyDiagnosis(WILD.slice(0, 4), { trials: 60, unit: 'pair', geometry: 'ring-bonds' })
  ],
  ['one shot', () => anyDiagnosis([[3, 1]], { trials: 12 })],
  ['all alike', () => anyDiagnosis([[0, 500]], { trials: null })],
  ['2 000 trials', () => anyDiagnosis(WIDE, { trials: 2000 })],
  ['shots in order', inOrder],
  [
    'kinks as read',
    () =>
      diagnose(readKinks(6, 60, 0.05, 0.02, 3000), {
        ...defaultOptions,
        trials: 60,
        geometry: 'open-bonds',
        misread: 0.02,
        resamples: 19
      })
  ]
];
