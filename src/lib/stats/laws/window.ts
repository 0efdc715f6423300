/**
 * Consecutive probabilities f_first, f_first+1, … each times `scale`; zero outside.
 *
 * The scale exists because doubles end at 1e-308: started from 1, a partial product that underflows
 * loses its part in everything built on it, and values near 1e-300 come out wrong by several per cent.
 * Started from 1e290, the same values have 290 more decades below them.
 */
export interface Window {
  first: number;
  values: Float64Array;
  scale: number;
}

/** Where the values of an untrimmed window start from. */
export const deepScale = 1e290;
/** Under the smallest normal double values lose digits, so a window ends there. */
export const smallestNormal = 2.3e-308;
