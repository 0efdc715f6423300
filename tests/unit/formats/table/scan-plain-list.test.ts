import { describe, expect, it } from 'vitest';
import { scanPlainList } from '$lib/formats/table/scan-plain-list';

const scan = (text: string, firstLine = 1, largest = Infinity, decoded = false, names = 0) =>
  scanPlainList(new TextEncoder().encode(text), firstLine, names, largest, decoded);

describe('scanPlainList', () => {
  it.each(['\n', '\r\n', '\r'])('reads numbers, blank lines and comments between %j', (end) => {
    const lines = ['# shots', '', 'count', '3', '', ' 4 ', '# break', '5\t', '\t007'];
    const want = { values: Uint32Array.of(3, 4, 5, 7), blankLines: 2, commentLines: 2 };
    expect(scan(lines.join(end), 4, Infinity, false, 1)).toEqual(want);
    expect(scan(lines.join(end) + end, 4, Infinity, false, 1)).toEqual(want);
  });

  it.each(['4.0', '-4', '4 5', '1234567890', 'x', '4,5', '"4"', '4#', '4\f', '+4', '4\u00a0', '٤', '\0'])(
    'leaves %j alone',
    (line) => {
      expect(scan(`3\n${line}\n`)).toBeNull();
      expect(scan(`3\n${line}`, 1, Infinity, true)).toBeNull();
    }
  );

  it('leaves lines above the numbers alone that are neither blank, comment nor the name', () => {
    expect(scan('a\n3\n', 2)).toBeNull();
    expect(scan('a\nb\n3\n', 3, Infinity, false, 1)).toBeNull();
    expect(scan('\f\na\n3\n', 3, Infinity, true, 1)).toBeNull();
  });

  it('leaves a list with a value above the largest alone', () => {
    expect(scan('3\n4\n', 1, 3)).toBeNull();
  });

  it('leaves alone bytes in a comment that may be no text, unless they were decoded', () => {
    for (const remark of ['# Häufigkeit', '# \u0001', '# \u007f']) {
      expect(scan(`3\n${remark}\n4\n`)).toBeNull();
      expect(scan(`3\n${remark}\n4\n`, 1, Infinity, true)?.values).toEqual(Uint32Array.of(3, 4));
      expect(scan(`${remark}\n4\n`, 2)?.values).toEqual(Uint32Array.of(4));
    }
  });
});
