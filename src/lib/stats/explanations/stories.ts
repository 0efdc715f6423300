import { bursts } from './stories/bursts';
import { commonCause } from './stories/common-cause';
import { deadShots } from './stories/dead-shots';
import { misreadSites } from './stories/misread-sites';
import { neighbours } from './stories/neighbours';
import { pairLoss } from './stories/pair-loss';
import { twoSettings } from './stories/two-settings';
import type { Story } from './story';

/** One line a story. */
export const stories: Story[] = [
  commonCause,
  neighbours,
  twoSettings,
  bursts,
  deadShots,
  pairLoss,
  misreadSites
];
