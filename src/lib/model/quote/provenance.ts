/** Where a document comes from, as far as it may be told. Blind: all of it null but the address and the digest. */
export interface Provenance {
  /** Name of the dataset or file. */
  name: string | null;
  team: string | null;
  device: string | null;
  firmware: string | null;
  /** Part of the device that was counted. */
  group: string | null;
  /** Number of the report in its team. */
  number: number | null;
  /** Milliseconds since 1970. */
  madeAt: number | null;
  /** Address at which a reader finds the report. */
  url: string | null;
  /** sha256 of the document's bytes, 64 hexadecimal digits; null where it is kept back. */
  sha256: string | null;
}

/** Nothing known. */
export const NO_PROVENANCE: Provenance = {
  name: null,
  team: null,
  device: null,
  firmware: null,
  group: null,
  number: null,
  madeAt: null,
  url: null,
  sha256: null
};
