import type { Diagnosis } from '$lib/stats/types';

/** What is known of the measurement besides its counts. Keys that are missing or null are not stated. */
export interface Conditions {
  name?: string | null;
  device?: string | null;
  firmware?: string | null;
  group?: string | null;
  quenchTime?: number | null;
  quenchUnit?: string | null;
  holdTime?: number | null;
  holdUnit?: string | null;
  trialsWhy?: string | null;
  postSelection?: string | null;
  measuredOn?: string | null;
  notes?: string | null;
}

/** Who, when and where. Null says nothing: a blind report leaves all of it out. */
export interface Provenance {
  madeBy: string | null;
  /** When the report was made. It is also the date of the file, so that the same report gives the same bytes. */
  madeAt: Date | null;
  team: string | null;
  dataset: string | null;
  conditions: Conditions | null;
  /** Where the report can be read; an http or https address. */
  link: string | null;
}

export interface ReportInput {
  document: Diagnosis;
  /** sha256 of the document's text, hexadecimal, with or without "sha256:" before it. */
  documentSha256: string;
  provenance: Provenance;
}
