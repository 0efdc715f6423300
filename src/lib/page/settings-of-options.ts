import { writeKept } from '$lib/model/read-kept';
import type { DiagnoseOptions } from '$lib/stats/types';
import { freshSettings, type Settings } from './settings';

/** The fields that stand for these options; what is left out keeps the value of a fresh page. */
export function settingsOfOptions(options: Partial<DiagnoseOptions>): Settings {
  const settings = freshSettings();
  if (options.trials !== undefined)
    settings.trials = options.trials === null ? 'unknown' : `${options.trials}`;
  if (options.unit) settings.unit = options.unit;
  if (options.geometry) settings.geometry = options.geometry;
  if (typeof options.misread === 'number') settings.misread = `${options.misread}`;
  if (options.misreadUncertainty) settings.misreadUncertainty = `${options.misreadUncertainty}`;
  if (options.kept) settings.kept = writeKept(options.kept);
  if (options.alpha !== undefined) settings.alpha = `${options.alpha}`;
  if (options.tolerance !== undefined) settings.tolerance = `${options.tolerance}`;
  if (options.resamples !== undefined) settings.resamples = `${options.resamples}`;
  if (options.seed !== undefined) settings.seed = `${options.seed}`;
  if (options.supplied) settings.supplied = options.supplied.join(' ');
  return settings;
}
