import type { Generator } from '../random/generator';
import type { CountData } from '../types';

/** Shots that are no independent trials, in a known way and a known strength. */
export interface Violation {
  id: string;
  /** What happens, and what the strength measures. */
  about: string;
  /** N as told to the diagnosis. */
  trials: number;
  /** From hardly to plainly visible at a few thousand shots. */
  strengths: number[];
  draw(random: Generator, shots: number, strength: number): CountData;
}
