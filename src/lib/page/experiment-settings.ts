import type { Settings } from './settings';

/** What the fields say of the experiment, without how hard to look. */
export const experimentSettings = ({
  trials,
  unit,
  geometry,
  misread,
  misreadUncertainty,
  kept
}: Settings): Partial<Settings> => ({ trials, unit, geometry, misread, misreadUncertainty, kept });
