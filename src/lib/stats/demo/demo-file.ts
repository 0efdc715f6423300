import type { Generator } from '../random/generator';
import type { Geometry, Unit } from '../types';

/**
 * One file of invented data with a known cause. The laboratory, its devices and its firmware do not exist.
 */
export interface DemoFile {
  /** Name of the file without `.csv`, and of the sample in addresses. */
  slug: string;
  title: string;
  /** What is said to have been counted. */
  about: string;
  /** What really made the counts. */
  cause: string;
  trials: number | null;
  unit: Unit;
  geometry: Geometry;
  /** Seed of its random numbers. */
  seed: number;
  /** Header and rows, drawn with the generator it is given. */
  rows: (stream: (stream: number) => Generator) => string[];
}
