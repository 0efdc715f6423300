import type { CountData, Diagnosis } from '$lib/stats/types';

/** What a bundle is made of. Whoever calls puts in only what its reader may see. */
export interface BundleInput {
  document: Diagnosis;
  /** The document byte for byte as it is stored. */
  documentText: string;
  /** What was diagnosed; null where it is not at hand, and the counts in the document have to do. */
  data: CountData | null;
  /** The law that was given to compare with, as it was given; it stands in no document. */
  supplied: number[] | null;
  /** Whose report it is and when it was made, a sentence each; none for a blind link. */
  about: string[];
  /** Conditions of the measurement by name; null to leave them out. */
  conditions: Record<string, string | number | null> | null;
  /** The report for print; null where it cannot be made. */
  pdf: Uint8Array | null;
  /** SVG files of the charts by name. */
  charts: Record<string, string>;
  /** The file of counts as it came, byte for byte; null where it is not at hand or holds more than these counts. */
  original: { name: string; bytes: Uint8Array } | null;
}

/** A file of a bundle and what it is, in words. */
export interface BundleFile {
  path: string;
  what: string;
  bytes: Uint8Array;
  sha256: string;
}
