import { landauZenerLevels } from '../demo/landau-zener-levels';
import type { Level } from '../types';
import type { Truth } from './truth';

/** Probability of the equal trials for each N. */
const equal = new Map([
  [12, 0.3],
  [20, 0.2],
  [64, 0.15]
]);

/**
 * Laws under which every test must keep its level: four families at N = 12, 20 and 64 with N told, and each
 * family once with N withheld.
 *
 * - equal: the most dispersed law of its mean, so the ceiling test is at its nominal level; with N withheld
 *   that is the Poisson law;
 * - spread: probabilities evenly spaced from 0.05 to 0.9, variance a half or so of the ceiling;
 * - sparse: two trials at 0.4 and 0.3 and all others tiny, mean 1.5: a third of the shots are empty;
 * - landau-zener: modes p = exp(−2k²), mean N/5, many trials at practically 0.
 */
export const truths: Truth[] = [
  ...[...equal].flatMap(([trials, p]): Truth[] => [
    truth('equal', trials, [{ p, trials }]),
    truth('spread', trials, spread(trials)),
    truth('sparse', trials, sparse(trials)),
    truth('landau-zener', trials, landauZenerLevels(2 * trials, 2))
  ]),
  { id: 'equal-unknown', family: 'equal', trials: null, law: { levels: [], poissonPart: 4 } },
  withheld(truth('spread', 20, spread(20))),
  withheld(truth('sparse', 64, sparse(64))),
  withheld(truth('landau-zener', 64, landauZenerLevels(128, 2)))
];

function truth(family: Truth['family'], trials: number, levels: Level[]): Truth {
  return { id: `${family}-${trials}`, family, trials, law: { levels, poissonPart: 0 } };
}

function withheld(known: Truth): Truth {
  return { ...known, id: `${known.family}-unknown`, trials: null };
}

function spread(trials: number): Level[] {
  return Array.from({ length: trials }, (_, i) => ({ p: 0.05 + (0.85 * i) / (trials - 1), trials: 1 }));
}

function sparse(trials: number): Level[] {
  return [
    { p: 0.4, trials: 1 },
    { p: 0.3, trials: 1 },
    { p: 0.8 / (trials - 2), trials: trials - 2 }
  ];
}
