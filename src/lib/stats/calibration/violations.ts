import type { Violation } from './violation';
import { bursts } from './violations/bursts';
import { commonCause } from './violations/common-cause';
import { deadShots } from './violations/dead-shots';
import { drift } from './violations/drift';
import { neighbours } from './violations/neighbours';
import { pairLoss } from './violations/pair-loss';
import { ringPairs } from './violations/ring-pairs';
import { smallestExcess } from './violations/smallest-excess';
import { twoSettings } from './violations/two-settings';

/** Known violations that power is measured against, one line each. */
export const violations: Violation[] = [
  smallestExcess,
  commonCause,
  neighbours,
  twoSettings,
  bursts,
  deadShots,
  pairLoss,
  ringPairs,
  drift
];
