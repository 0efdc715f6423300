import type { SteadyReport } from '$lib/stats/sweep/types';

/** Ratios of a sweep as they are written. */
export const RATIO_NAMES: Record<SteadyReport['id'], string> = {
  'variance-over-mean': 'κ₂/κ₁',
  'third-over-mean': 'κ₃/κ₁',
  'pair-factor': 'F₂/F₁²'
};

/** Laws whose ratios are known, in words. */
export const KNOWN_LAWS: Record<string, string> = {
  'landau-zener': 'Landau–Zener modes',
  coarsening: 'coarsening from zero temperature',
  'rare-events': 'rare independent events'
};
