import { testIds } from '../test-ids';
import type { Generator } from '../random/generator';
import type { CountData, DiagnoseOptions } from '../types';
import type { PName } from './outcome';

/** Independent trials as an apparatus hands them over, with what was stated of it; and the same with an excess. */
export interface Nuisance {
  id: string;
  about: string;
  /** N as told to the diagnosis. */
  trials: number;
  /** What is stated of the nuisance. */
  options: Partial<DiagnoseOptions>;
  /** Tests that must keep their level where there is no excess; the others may see the nuisance itself. */
  judges: PName[];
  /** The test that is to see the excess. */
  sees: PName;
  /** @param strength excess over the ceiling in units of the smallest that the diagnosis says it sees; 0: none */
  draw(random: Generator, shots: number, strength: number): CountData;
}

/** Every test of a histogram. */
export const everyTest: PName[] = [
  ...testIds.filter((id) => id !== 'batches' && id !== 'order'),
  'certificate'
];
