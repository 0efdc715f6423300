import { chainCount } from './chain-count';
import type { DemoFile } from './demo-file';
import { tally } from './tally';

const SITES = 48;
const P = 0.1;
/** Correlation of neighbouring sites in each version; variance over ceiling is about (1 + c)/(1 − c). */
const VERSIONS: [string, number][] = [
  ['ebb 3.1', 0],
  ['ebb 3.2', 0],
  ['ebb 3.3', 0.15],
  ['ebb 3.4', 0]
];

/** The same device under four firmware versions, the third of which lets neighbours talk to each other. */
export const firmwareVersions: DemoFile = {
  slug: 'firmware-versions',
  title: 'Four firmware versions',
  about: 'Wrackline Bay chain laboratory, device Marram: flipped sites of 48 under firmware ebb 3.1 to 3.4.',
  cause: `sites with probability ${P}; independent in versions 3.1, 3.2 and 3.4, neighbours correlated by 0.15 in version 3.3.`,
  trials: SITES,
  unit: 'defect',
  geometry: 'sites',
  seed: 6408,
  rows: (stream) => [
    'device,firmware,count,shots',
    ...VERSIONS.flatMap(([version, correlation], index) => {
      const random = stream(index);
      const shots = Array.from({ length: 4000 }, () => chainCount(random, SITES, P, correlation));
      return tally(shots).map(([count, number]) => `Marram,${version},${count},${number}`);
    })
  ]
};
