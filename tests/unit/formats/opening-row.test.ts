import { readCounts } from '$lib/formats/read-counts';
import { sayReading } from '$lib/formats/say-reading';
import { countsCsv } from '$lib/model/exports/counts-csv';
import { writeAddress } from '$lib/page/address';
import { readAddress } from '$lib/page/read-address';
import { textOfData } from '$lib/page/text-of-data';
import { defaultOptions } from '$lib/stats/default-options';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

const expected: Histogram = {
  kind: 'histogram',
  counts: [
    [3, 40],
    [4, 21]
  ],
  lump: { from: 5, shots: 9 },
  below: { to: 2, shots: 30 }
};

describe('an opening row', () => {
  it.each([
    'count,shots\n0-2,30\n3,40\n4,21\n5+,9\n',
    '≤2;30\n3;40\n4;21\n≥5;9\n',
    '2 or fewer\t30\n3\t40\n4\t21\n5 or more\t9\n',
    '<= 2 30\n3 40\n4 21\n>= 5 9\n',
    '0 - 2   30\n3   40\n4   21\n5 +   9\n',
    '{"counts": {"0-2": 30, "3": 40, "4": 21, "5+": 9}}',
    '[["≤2", 30], [3, 40], [4, 21], ["5+", 9]]',
    '{"counts": [[3, 40], [4, 21]], "lump": {"from": 5, "shots": 9}, "below": {"to": 2, "shots": 30}, "shots": 100}'
  ])('is read in %j', (text) => {
    const read = readCounts(text);
    expect(read).toMatchObject({ ok: true, datasets: [{ data: expected }] });
    expect(sayReading(read.reading).join(' ')).toContain('is read as "2 or fewer"');
  });

  it('comes back from the table, the field and the address that are written of it', () => {
    expect(readCounts(countsCsv(expected))).toMatchObject({ ok: true, datasets: [{ data: expected }] });
    expect(readCounts(textOfData(expected))).toMatchObject({ ok: true, datasets: [{ data: expected }] });
    const address = writeAddress(expected, { ...defaultOptions, trials: 12 }, null);
    expect(address).toContain('counts=0-2:30,3:40,4:21,5+:9');
    expect(address).toContain('sum=100');
    expect(readAddress(address!)).toMatchObject({ ok: true, address: { data: expected, whole: true } });
  });

  it.each(['3:40,0-2:30', '0-2:30,0-3:1', '0-2+:30'])('is refused in the address part %s', (part) => {
    expect(readAddress(`counts=${part}`).ok).toBe(false);
  });

  it('is refused in JSON that overlaps, with its line', () => {
    const read = readCounts('{"counts": {\n"3": 40,\n"0-3": 30}}');
    expect(read).toMatchObject({ ok: false, problems: [{ line: 3 }] });
  });
});
