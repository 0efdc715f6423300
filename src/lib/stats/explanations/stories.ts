import { bursts } from './stories/bursts';
import { commonCause } from './stories/common-cause';
import { deadShots } from './stories/dead-shots';
import { misreadRing } from './stories/misread-ring';
import { misreadSites } from './stories/misread-sites';
import { neighbours } from './stories/neighbours';
import { pairLoss } from './stories/pair-loss';
import { twoSettings } from './stories/two-settings';
import type { Geometry } from '../types';
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

/** The stories of an experiment: round a ring misread sites have a law of their own. */
export const storiesOn = (geometry: Geometry): Story[] =>
  geometry === 'ring-bonds' ? stories.map((one) => (one === misreadSites ? misreadRing : one)) : stories;
