import type { SweepReport } from '$lib/stats/sweep/types';

/** A dataset that a sweep was made of, as it was then. */
export interface SweepSource {
  name: string;
  device: string | null;
  firmware: string | null;
  group: string | null;
  digest: string;
}

/** What the PDF of a sweep is made from. Null says nothing: a blind one leaves all of it out. */
export interface SweepPdfInput {
  document: SweepReport;
  /** sha256 of the document's text, hexadecimal. */
  documentSha256: string;
  engineVersion: string;
  name: string | null;
  notes: string | null;
  madeBy: string | null;
  /** When the sweep was made. It is also the date of the file, so that the same sweep gives the same bytes. */
  madeAt: Date | null;
  team: string | null;
  /** In the order they were given; null where nothing may be told of them. */
  sources: SweepSource[] | null;
  /** Where the sweep can be read; an http or https address. */
  link: string | null;
}
