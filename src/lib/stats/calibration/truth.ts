import type { Law } from '../types';

export type TruthFamily = 'equal' | 'spread' | 'sparse' | 'landau-zener';

/** An independent-trial law to draw shots from, and what the diagnosis is told about it. */
export interface Truth {
  /** `family-N`, or `family-unknown`. */
  id: string;
  family: TruthFamily;
  /** N as told to the diagnosis; null when it is withheld. */
  trials: number | null;
  law: Law;
}
