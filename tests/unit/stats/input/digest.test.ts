import { digest } from '$lib/stats/input/digest';
import { toHistogram } from '$lib/stats/input/to-histogram';
import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';

describe('digest', () => {
  it('is the sha256 of the canonical text, by another implementation', () => {
    const text = 'severalty.histogram/1\n0 5\n2 7\n4+ 3\n';
    const expected = `sha256:${createHash('sha256').update(text).digest('hex')}`;
    const histogram = toHistogram({
      kind: 'histogram',
      counts: [
        [2, 7],
        [0, 5],
        [1, 0]
      ],
      lump: { from: 4, shots: 3 }
    });
    expect(digest(histogram)).toBe(expected);
  });

  it('does not depend on the order of shots', () => {
    const once = digest(toHistogram({ kind: 'shots', shots: [1, 0, 1, 2], batches: null }));
    expect(digest(toHistogram({ kind: 'shots', shots: [2, 1, 1, 0], batches: null }))).toBe(once);
  });
});
