import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { readCounts } from '$lib/formats/read-counts';
import { scanPlainList } from '$lib/formats/table/scan-plain-list';

describe('scanPlainList', () => {
  it('reads numbers, blank lines and comments', () => {
    const scanned = scanPlainList('# shots\ncount\n3\n\n 4 \n# break\n5', 3, Infinity);
    expect(scanned).toEqual({ values: Uint32Array.of(3, 4, 5), blankLines: 1, commentLines: 2 });
  });

  it.each(['3\n4.0\n', '3\n-4\n', '3\n4 5\n', '3\n1234567890\n', '3\nx\n', '3\n4,5\n'])(
    'leaves %j alone',
    (text) => {
      expect(scanPlainList(text, 1, Infinity)).toBeNull();
    }
  );

  it('leaves a list with a value above the largest alone', () => {
    expect(scanPlainList('3\n4\n', 1, 3)).toBeNull();
  });

  it('gives what the table parser gives', () => {
    // Long enough (300 kB) for the fast way; one "1e0" at the end sends the same text the slow way.
    const line = fc.oneof(
      { weight: 8, arbitrary: fc.integer({ min: 0, max: 999 }).map(String) },
      { weight: 1, arbitrary: fc.constantFrom('', ' 7 ', '\t8', '# remark', '#', '00012', '   ') }
    );
    const ending = fc.constantFrom('\n', '\r\n', '\r');
    const head = fc.constantFrom('', 'count\n', '# made by hand\n\nkinks\n', '# count\n');
    fc.assert(
      fc.property(fc.array(line, { minLength: 20, maxLength: 40 }), ending, head, (lines, end, start) => {
        const block = lines.join(end) + end;
        const text = start + '1' + end + block.repeat(Math.ceil(310_000 / block.length));
        const fast = readCounts(text);
        const slow = readCounts(`${text}1e0`);
        expect(fast.ok && slow.ok).toBe(true);
        if (!fast.ok || !slow.ok) return;
        const [quick, plain] = [fast.datasets[0].data, slow.datasets[0].data];
        if (quick.kind !== 'shots' || plain.kind !== 'shots') throw new Error('not shot lists');
        expect(Array.from(quick.shots)).toEqual(Array.from(plain.shots).slice(0, -1));
        expect({ ...fast.reading, rows: fast.reading.rows + 1 }).toEqual(slow.reading);
        expect(fast.notes).toEqual(slow.notes);
      }),
      { numRuns: 12 }
    );
  });
});
