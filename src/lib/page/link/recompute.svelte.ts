import { compareDocuments, type Difference } from '$lib/model/compare-documents';
import { documentText } from '$lib/model/document-text';
import { engineVersion } from '$lib/stats/engine-version';
import type { CountData, DiagnoseOptions } from '$lib/stats/types';
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Running } from '../check.svelte';
import { startRun, type Run } from '../runner';

/** A report with its counts, as a link shares it. */
export interface Recomputable {
  document: string;
  sha256: string;
  options: DiagnoseOptions;
  counts: CountData;
}

export type Recomputed =
  | { kind: 'same'; sha256: string }
  | { kind: 'differs'; sha256: string; differences: Difference[] }
  /** The document is not the one that was stored: it was changed on the way, and nothing was computed. */
  | { kind: 'changed'; received: string }
  | { kind: 'failed'; message: string };

/** Version of the engine that this page carries. */
export const pageEngine = engineVersion;

/** sha256 of a text's bytes. A package, since Web Crypto is missing on plain http. */
export const sha256Of = (text: string): string => bytesToHex(sha256(utf8ToBytes(text)));

/** Computes a stored report anew in this browser, and holds the two documents together. */
export class Recompute {
  running = $state.raw<Running | null>(null);
  outcome = $state.raw<Recomputed | null>(null);
  #run: Run | null = null;

  async start({ document, sha256: stored, options, counts }: Recomputable): Promise<void> {
    this.cancel();
    this.outcome = null;
    // What the page was given may differ from what the server keeps; then a match would be one with another report.
    const received = sha256Of(document);
    if (received !== stored) {
      this.outcome = { kind: 'changed', received };
      return;
    }
    const since = performance.now();
    this.running = { share: 0, step: 'fit', since };
    const run = startRun(counts, options, (progress) => {
      if (this.#run === run) this.running = { ...progress, since };
    });
    this.#run = run;
    const answer = await run.result;
    if (this.#run !== run) return;
    this.#run = null;
    this.running = null;
    if (!answer.ok) {
      if (answer.reason !== 'cancelled') this.outcome = { kind: 'failed', message: answer.message };
      return;
    }
    const ours = documentText(answer.diagnosis);
    const sum = sha256Of(ours);
    this.outcome =
      ours === document
        ? { kind: 'same', sha256: sum }
        : { kind: 'differs', sha256: sum, differences: differences(document, ours) };
  }

  cancel(): void {
    this.#run?.cancel();
    this.#run = null;
    this.running = null;
  }
}

/** Values that differ; two texts of equal values differ in how they are written. */
function differences(theirs: string, ours: string): Difference[] {
  let stored: unknown;
  try {
    stored = JSON.parse(theirs);
  } catch {
    return [{ path: 'the whole document', theirs: 'not JSON', ours: 'JSON' }];
  }
  const found = compareDocuments(stored, JSON.parse(ours));
  if (found.length > 0) return found;
  return [
    { path: 'spaces, or the order of keys', theirs: `${theirs.length} characters`, ours: `${ours.length}` }
  ];
}
