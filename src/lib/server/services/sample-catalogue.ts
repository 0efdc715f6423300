import type { Sample } from './samples';

type Entry = Omit<Sample, 'id' | 'fileName' | 'text' | 'order'> & { file: string };

/** The shipped samples in the order of the list; `file` is relative to fixtures/. */
export const CATALOGUE: Entry[] = [];
