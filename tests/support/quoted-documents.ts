import { readCounts } from '$lib/formats/read-counts';
import { defaultOptions } from '$lib/stats/default-options';
import { DEMO_FILES } from '$lib/stats/demo/demo-files';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData, DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { readFileSync } from 'node:fs';

export interface QuotedDocument {
  name: string;
  document: Diagnosis;
}

const PUBLISHED: [string, number | null][] = [
  ['weldon-dice', 12],
  ['weldon-dice-lumped', 12],
  ['rutherford-geiger', null],
  ['horse-kicks', null],
  ['yeast-square-a', null],
  ['greenwood-yule', null]
];

const histogram = (...counts: [number, number][]): CountData => ({ kind: 'histogram', counts, lump: null });

/** What a document can lack: spread, defects, intervals, tests, a number of trials. */
const EDGES: [string, CountData, Partial<DiagnoseOptions>][] = [
  ['one shot', histogram([3, 1]), { trials: 8 }],
  ['one shot without defects', histogram([0, 1]), {}],
  ['every shot at one count', histogram([4, 500]), { trials: 9 }],
  ['no defect', histogram([0, 500]), { trials: 9 }],
  ['every trial', histogram([9, 500]), { trials: 9 }],
  ['one trial', histogram([0, 60], [1, 40]), { trials: 1 }],
  ['two shots', histogram([0, 1], [7, 1]), {}],
  [
    'nearly all in a lump',
    { kind: 'histogram', counts: [[0, 2]], lump: { from: 3, shots: 70 } },
    { trials: 9 }
  ],
  [
    'a lump, trials unknown',
    {
      kind: 'histogram',
      counts: [
        [0, 70],
        [1, 40]
      ],
      lump: { from: 2, shots: 20 }
    },
    {}
  ],
  ['nineteen draws', histogram([0, 70], [1, 40], [2, 12]), { resamples: 19, seed: 4294967295 }],
  [
    'misread bonds in pairs',
    histogram([0, 70], [2, 40], [4, 12]),
    { trials: 20, unit: 'pair', geometry: 'ring-bonds', misread: 0.07 }
  ],
  [
    'a far tail',
    histogram([0, 9000], [1, 900], [40, 100]),
    { trials: 64, geometry: 'open-bonds', alpha: 0.001, tolerance: 0.14 }
  ],
  ['very many shots', histogram([0, 9e12], [1, 9e10]), { trials: 64 }],
  [
    'a long order',
    {
      kind: 'shots',
      shots: Array.from({ length: 20_100 }, (_, i) => (i * 7919) % 5),
      batches: Array.from({ length: 20_100 }, (_, i) => String(i % 50))
    },
    { trials: 12, resamples: 19 }
  ]
];

let made: Promise<QuotedDocument[]> | null = null;

/** Every fixture diagnosed with few draws, and documents in which something is missing. */
export function quotedDocuments(): Promise<QuotedDocument[]> {
  made ??= all();
  return made;
}

async function all(): Promise<QuotedDocument[]> {
  const out: QuotedDocument[] = [];
  const add = async (name: string, data: CountData, options: Partial<DiagnoseOptions>) => {
    out.push({ name, document: await diagnose(data, { ...defaultOptions, resamples: 99, ...options }) });
  };
  for (const [name, trials] of PUBLISHED) await add(name, dataOf(`fixtures/${name}.csv`)[0], { trials });
  for (const { slug, trials, unit, geometry } of DEMO_FILES)
    for (const data of dataOf(`fixtures/demo/${slug}.csv`)) await add(slug, data, { trials, unit, geometry });
  // Draws enough for a test to reach the level by itself, and for another to end early.
  await add('greenwood-yule, more draws', dataOf('fixtures/greenwood-yule.csv')[0], { resamples: 999 });
  await add('horse-kicks, more draws', dataOf('fixtures/horse-kicks.csv')[0], { resamples: 499 });
  for (const [name, data, options] of EDGES) await add(name, data, options);
  return out;
}

function dataOf(path: string): CountData[] {
  const read = readCounts(new Uint8Array(readFileSync(path)));
  if (!read.ok) throw new Error(`${path} is not read`);
  return read.datasets.map(({ data }) => data);
}
