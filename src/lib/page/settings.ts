import type { Geometry, Unit } from '$lib/stats/types';

/** What stands in the fields beside the counts, as typed: a wrong entry stays where it is. */
export interface Settings {
  trials: string;
  unit: Unit;
  geometry: Geometry;
  misread: string;
  /** Standard uncertainty of that chance; empty where it is taken as exact. */
  misreadUncertainty: string;
  /** Counts kept, as 0-4 or 1-; empty where no shot was dropped. */
  kept: string;
  alpha: string;
  tolerance: string;
  resamples: string;
  seed: string;
  supplied: string;
}

export type SettingName = keyof Settings;

/** Settings that are typed, not chosen. */
export type TypedName = Exclude<SettingName, 'unit' | 'geometry'>;

/** The fields of a fresh page. */
export const freshSettings = (): Settings => ({
  trials: '',
  unit: 'defect',
  geometry: 'sites',
  misread: '',
  misreadUncertainty: '',
  kept: '',
  alpha: '0.01',
  tolerance: '0.1',
  resamples: '1999',
  seed: '1',
  supplied: ''
});
