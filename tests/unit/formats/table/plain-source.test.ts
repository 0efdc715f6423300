import { describe, expect, it, vi } from 'vitest';
import fc from 'fast-check';
import { readCounts } from '$lib/formats/read-counts';
import type { plainSource } from '$lib/formats/table/plain-source';
import type { ReadOptions, ReadResult } from '$lib/formats/types';
import { toHistogram } from '$lib/stats/input/to-histogram';
import { BadInput } from '$lib/stats/types';

const ways = vi.hoisted(() => ({ ordinary: false, quick: 0 }));

/** Shuts the quick way while `ways.ordinary`, and counts what went through it. */
vi.mock('$lib/formats/table/plain-source', async (original) => {
  const real = await original<{ plainSource: typeof plainSource }>();
  return {
    plainSource: (...given: Parameters<typeof plainSource>) => {
      const source = ways.ordinary ? null : real.plainSource(...given);
      if (source) ways.quick += 1;
      return source;
    }
  };
});

/** All that a reader gets, with shots in their order as plain numbers and their histogram beside them. */
function told(result: ReadResult): unknown {
  if (!result.ok) return result;
  const datasets = result.datasets.map(({ data, ...rest }) => ({
    ...rest,
    data: data.kind === 'shots' ? { ...data, shots: Array.from(data.shots) } : data,
    histogram: summed(data)
  }));
  return { ...result, datasets };
}

function summed(data: Parameters<typeof toHistogram>[0]): unknown {
  try {
    return toHistogram(data);
  } catch (error) {
    if (error instanceof BadInput) return error.reason;
    throw error;
  }
}

function bothWays(input: Uint8Array | string, options: ReadOptions): { quick: unknown; ordinary: unknown } {
  ways.ordinary = false;
  const quick = told(readCounts(input, options));
  ways.ordinary = true;
  return { quick, ordinary: told(readCounts(input, options)) };
}

const plain = fc.oneof(
  { weight: 20, arbitrary: fc.integer({ min: 0, max: 30 }).map(String) },
  { weight: 2, arbitrary: fc.integer({ min: 0, max: 999_999_999 }).map(String) },
  { weight: 2, arbitrary: fc.constantFrom('', '  ', ' 7 ', '\t8', '9\t ', '00012', '0') },
  { weight: 1, arbitrary: fc.constantFrom('# remark', '#', ' # 12', '# "open', '#5') }
);
const odd = fc.constantFrom(
  ...['1.0', '1e1', '-3', 'x', '1 000', '1,5', '4;', '"5"', '"', '5#c', 'NaN', '', '\f', '10+', 'total'],
  ...['٣', '5\u00a0', '\u2028', '# réponse', '# \u0001', '\u0000', '1234567890', '4294967296', '0-2', '= 3']
);
const ends = fc.oneof(fc.constantFrom(['\n'], ['\r\n'], ['\r']), fc.constant(['\n', '\r\n', '\r']));
const heads = ['', 'count\n', 'kinks\n', '# made by hand\n\nkinks\n', '# Zähler\n', 'Häufigkeit\n', 'ｎ\n'];
const openings = [...heads, 'shots\n', 'a\nb\n', '{\n', '<html>\n', 'sep=,\n', '\ufeffcount\n', 'count  \r'];

/** Long without many lines: a remark of 300 kB stands between two runs of lines, so that a thousand files take seconds. */
const texts = fc
  .record({
    start: fc.oneof({ weight: 4, arbitrary: fc.constantFrom(...heads) }, fc.constantFrom(...openings)),
    before: fc.array(plain, { minLength: 1, maxLength: 30 }),
    after: fc.array(plain, { maxLength: 30 }),
    planted: fc.oneof(
      { weight: 2, arbitrary: fc.constant([]) },
      fc.array(fc.tuple(fc.nat(60), odd), { minLength: 1, maxLength: 3 })
    ),
    ends,
    closed: fc.boolean()
  })
  .map(({ start, before, after, planted, ends: kinds, closed }) => {
    const lines = [...before, `# ${'x'.repeat(301_000)}`, ...after];
    for (const [at, line] of planted) lines.splice(at % (lines.length + 1), 0, line);
    const joined = lines.map((line, i) => line + kinds[i % kinds.length]).join('');
    return start + (closed ? joined : joined.replace(/[\r\n]+$/, ''));
  });

const utf16 = (text: string, little: boolean, marked: boolean): Uint8Array => {
  const units = (marked ? '\ufeff' : '') + text;
  const bytes = new Uint8Array(2 * units.length);
  const view = new DataView(bytes.buffer);
  for (let i = 0; i < units.length; i++) view.setUint16(2 * i, units.charCodeAt(i), little);
  return bytes;
};
const encode: Record<string, (text: string) => Uint8Array | string> = {
  typed: (text) => text,
  utf8: (text) => new TextEncoder().encode(text),
  marked: (text) => new TextEncoder().encode(`\ufeff${text}`),
  wide: (text) => utf16(text, true, true),
  wideUnmarked: (text) => utf16(text, false, false),
  western: (text) => Uint8Array.from(text, (letter) => letter.charCodeAt(0) & 255)
};
const encodings = fc.oneof(
  { weight: 6, arbitrary: fc.constant('utf8') },
  fc.constantFrom(...Object.keys(encode))
);
const options: fc.Arbitrary<ReadOptions> = fc.oneof(
  { weight: 3, arbitrary: fc.constant({}) },
  fc.record<ReadOptions>(
    {
      format: fc.constantFrom('auto', 'shots', 'positions', 'counts', 'json'),
      encoding: fc.constantFrom('utf-8', 'utf-8', 'windows-1252', 'utf-16le'),
      separator: fc.constantFrom('none', 'comma', 'spaces', 'tab'),
      header: fc.boolean(),
      columns: fc.constantFrom([], [{ column: 1, role: 'count' }], [{ column: 1, role: 'ignored' }]),
      decimal: fc.constantFrom('.', ','),
      thousands: fc.constantFrom('.', ',', 'none'),
      trials: fc.constantFrom(null, 12, 30, 1e9),
      name: fc.constant('mine')
    },
    { requiredKeys: [] }
  )
);

describe('a long shot list read byte by byte', () => {
  it('gives what the ordinary way gives: counts in their order, histogram, reading, notes, problems with their lines', () => {
    ways.quick = 0;
    let cases = 0;
    fc.assert(
      fc.property(texts, encodings, options, (text, encoding, chosen) => {
        cases += 1;
        const { quick, ordinary } = bothWays(encode[encoding](text), chosen);
        expect(quick).toEqual(ordinary);
      }),
      { numRuns: 1500 }
    );
    // Else the comparison would say nothing.
    expect(ways.quick).toBeGreaterThan(cases / 5);
    expect(ways.quick).toBeLessThan(cases * 0.8);
  });

  it('also with many lines', () => {
    ways.quick = 0;
    const lines = fc.array(plain, { minLength: 20, maxLength: 40 });
    fc.assert(
      fc.property(lines, ends, fc.constantFrom(...heads), (block, [end], start) => {
        const text = `${start}1${end}${(block.join(end) + end).repeat(Math.ceil(301_000 / block.join(end).length))}`;
        const { quick, ordinary } = bothWays(text, {});
        expect(quick).toEqual(ordinary);
      }),
      { numRuns: 8 }
    );
    // A block may hold nothing but remarks.
    expect(ways.quick).toBeGreaterThan(5);
  });

  it('has no limit of rows, as no other way has for it', () => {
    ways.ordinary = false;
    const result = readCounts('12\n'.repeat(120_000), { maxRows: 100 });
    expect(result.ok && result.reading.rows).toBe(120_000);
  });
});
