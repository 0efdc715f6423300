import { createHash } from 'node:crypto';
import { digest } from '$lib/stats/input/digest';
import { describe, expect, it } from 'vitest';

describe('digest', () => {
  it('is the sha256 of the canonical text, in the words of another tool', () => {
    const histogram = {
      kind: 'histogram' as const,
      counts: [
        [0, 12],
        [3, 5]
      ] as [number, number][],
      lump: { from: 10, shots: 18 }
    };
    const text = 'severalty.histogram/1\n0 12\n3 5\n10+ 18\n';
    expect(digest(histogram)).toBe(`sha256:${createHash('sha256').update(text).digest('hex')}`);
    const plain = 'severalty.histogram/1\n0 12\n3 5\n';
    expect(digest({ ...histogram, lump: null })).toBe(
      `sha256:${createHash('sha256').update(plain).digest('hex')}`
    );
  });
});
