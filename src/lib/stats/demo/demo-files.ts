import { bunched } from './bunched';
import { deadShots } from './dead-shots';
import type { DemoFile } from './demo-file';
import { driftingShots } from './drifting-shots';
import { firmwareVersions } from './firmware-versions';
import { fortyShots } from './forty-shots';
import { hardCoreGas } from './hard-core-gas';
import { independent } from './independent';
import { misreadKinks } from './misread-kinks';
import { quenchSweep } from './quench-sweep';
import { ringKinks } from './ring-kinks';

/** Every demo file in the order in which they are shown. */
export const DEMO_FILES: DemoFile[] = [
  independent,
  bunched,
  misreadKinks,
  driftingShots,
  deadShots,
  ringKinks,
  hardCoreGas,
  fortyShots,
  quenchSweep,
  firmwareVersions
];
