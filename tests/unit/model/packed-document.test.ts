import { documentText } from '$lib/model/document-text';
import { packDocument, unpackDocument } from '$lib/model/packed-document';
import type { Diagnosis } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { diagnoseInvented } from '../../support/saved-reports';

/** Invented: 700 counts, some of them seen. */
const COUNTS: [number, number][] = Array.from({ length: 700 }, (_, i) => [i, i % 3 === 0 ? 0 : 1 + (i % 7)]);

describe('packDocument', () => {
  let long: Diagnosis;
  beforeAll(async () => {
    const data = { kind: 'histogram' as const, counts: COUNTS.filter(([, shots]) => shots > 0), lump: null };
    long = (await diagnoseInvented({ trials: 3000 }, data)).document;
  });

  it('gives the same document again, to the last digit, through JSON too', () => {
    const packed = packDocument(long);
    if (!packed) throw new Error('not packed');
    expect(documentText(unpackDocument(packed))).toBe(documentText(long));
    const sent = JSON.stringify(packed);
    expect(documentText(unpackDocument(JSON.parse(sent) as typeof packed))).toBe(documentText(long));
    // Nulls and numbers that doubles hold at their edge.
    expect(long.rate.points.some(({ empirical }) => empirical === null)).toBe(true);
    expect(sent.length).toBeLessThan(0.35 * documentText(long).length);
  });

  it('keeps the smallest, the largest and negative numbers', () => {
    const edge = structuredClone(long);
    const values = [5e-324, Number.MAX_VALUE, -1.5, -0, 0.1, 2 ** 53];
    values.forEach((value, i) => (edge.distribution[i].fitted = value));
    const packed = packDocument(edge);
    if (!packed) throw new Error('not packed');
    const back = unpackDocument(packed).distribution.slice(0, values.length);
    back.forEach(({ fitted }, i) => expect(Object.is(fitted, values[i])).toBe(true));
  });

  it('leaves everything else alone, what is packed already too', async () => {
    const { document } = await diagnoseInvented();
    const packed = packDocument(long);
    for (const value of [document, null, 'x', 7, [], {}, { format: 'severalty.diagnosis/1' }, packed])
      expect(packDocument(value)).toBe(false);
    expect(packDocument(packed && packed.packed)).toBe(false);
  });
});
