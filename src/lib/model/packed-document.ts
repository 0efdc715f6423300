import type { Diagnosis } from '$lib/stats/types';
import { packRows, unpackRows, type PackedRows } from './packed-rows';

/** Rows of a document below which packing saves nothing. */
const LONG = 500;

/** A document on its way from server to page, its three long lists as columns. */
export interface PackedDocument {
  packed: object;
}

/**
 * A document whose lists are long, packed for the way to the page: 9 MB of ten thousand counts become 2.5; false for
 * anything else, which goes as it is.
 */
export function packDocument(value: unknown): PackedDocument | false {
  if (!isLong(value)) return false;
  const { distribution, rate, tails } = value;
  return {
    packed: {
      ...value,
      distribution: packRows(distribution),
      rate: { ...rate, points: packRows(rate.points) },
      tails: { ...tails, points: packRows(tails.points) }
    }
  };
}

/** The document again: the same values in the same order. */
export function unpackDocument({ packed }: PackedDocument): Diagnosis {
  const document = packed as Diagnosis;
  const rows = (of: unknown) => unpackRows(of as PackedRows);
  return {
    ...document,
    distribution: rows(document.distribution),
    rate: { ...document.rate, points: rows(document.rate.points) },
    tails: { ...document.tails, points: rows(document.tails.points) }
  } as Diagnosis;
}

function isLong(value: unknown): value is Diagnosis {
  const document = value as Partial<Diagnosis> | null;
  return (
    typeof value === 'object' &&
    document?.format === 'severalty.diagnosis/1' &&
    Array.isArray(document.distribution) &&
    document.distribution.length >= LONG
  );
}
