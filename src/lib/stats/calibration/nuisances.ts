import type { Nuisance } from './nuisance';
import { cut } from './nuisances/cut';
import { deadSetAside } from './nuisances/dead-set-aside';
import { driftingBatches } from './nuisances/drifting-batches';
import { lumped } from './nuisances/lumped';
import { misreadBonds } from './nuisances/misread-bonds';
import { misreadRing } from './nuisances/misread-ring';
import { misreadSites } from './nuisances/misread-sites';
import { ringInPairs } from './nuisances/ring-in-pairs';

/** Nuisances that are stated, under which every test named must keep its level, one line each. */
export const nuisances: Nuisance[] = [
  misreadBonds('misread-bonds', 0),
  misreadBonds('misread-bonds-unsure', 0.001),
  misreadRing,
  misreadSites,
  ringInPairs,
  cut('empty-dropped', 40, 0.06, 1, null),
  cut('cut-both-ends', 20, 0.2, 1, 7),
  lumped('lumped-both-ends', 20, 0.3, 4, 9),
  driftingBatches,
  deadSetAside
];
