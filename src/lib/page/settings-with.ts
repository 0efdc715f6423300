import { writeKept } from '$lib/model/read-kept';
import type { DiagnoseOptions } from '$lib/stats/types';
import type { Settings } from './settings';

/** The settings with what an example or a file states put in its fields. */
export function settingsWith(settings: Settings, options: Partial<DiagnoseOptions>): Settings {
  const { trials, misread, misreadUncertainty, kept, unit, geometry } = options;
  const stated: Partial<Settings> = {};
  if (trials !== undefined) stated.trials = trials === null ? 'unknown' : `${trials}`;
  if (misread !== undefined) stated.misread = misread === null ? '' : `${misread}`;
  if (misreadUncertainty !== undefined)
    stated.misreadUncertainty = misreadUncertainty === null ? '' : `${misreadUncertainty}`;
  if (kept !== undefined) stated.kept = kept === null ? '' : writeKept(kept);
  if (unit) stated.unit = unit;
  if (geometry) stated.geometry = geometry;
  return { ...settings, ...stated };
}
