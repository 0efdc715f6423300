import { bibtex } from '$lib/model/quote/citation/bibtex';
import { NO_PROVENANCE, type Provenance } from '$lib/model/quote/provenance';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const digest = `sha256:${'1a'.repeat(32)}`;
const quotable = {
  data: { digest } as Parameters<typeof bibtex>[0]['data'],
  engine: { version: '0.2.0', seed: 1, resamples: 99, alpha: 0.01, tolerance: 0.1 }
};
const whole: Provenance = {
  name: 'Marram, ebb 3.3',
  team: 'Bay & Side',
  device: 'Marram',
  firmware: 'ebb 3.3',
  group: null,
  number: 7,
  madeAt: Date.UTC(2031, 1, 28, 23, 59),
  url: 'https://lab.example.org/link/aB_-c',
  sha256: '5f'.repeat(32)
};

/** Fields of an entry, read as BibTeX does: braces are counted whatever stands before them. */
function fieldsOf(entry: string): { key: string; fields: Record<string, string> } {
  const head = /^@misc\{([^,]*),\n/.exec(entry)!;
  const fields: Record<string, string> = {};
  let rest = entry.slice(head[0].length);
  for (let found; (found = /^ {2}(\w+) = /.exec(rest));) {
    rest = rest.slice(found[0].length);
    let end = /^\w+/.exec(rest)?.[0].length ?? 0;
    if (rest[0] === '{')
      for (let depth = 0; end < rest.length; end++) {
        if (rest[end] === '{') depth++;
        if (rest[end] === '}' && --depth === 0) break;
      }
    fields[found[1]] = rest[0] === '{' ? rest.slice(1, end) : rest.slice(0, end);
    rest = rest.slice(end + (rest[0] === '{' ? 1 : 0)).replace(/^,?\n/, '');
  }
  expect(rest).toBe('}');
  return { key: head[1], fields };
}

describe('a BibTeX entry', () => {
  it('of a report with an address', () => {
    const { key, fields } = fieldsOf(bibtex(quotable, whole));
    expect(key).toBe('severalty2031x5f5f5f5f');
    expect(fields).toEqual({
      author: '{Bay \\& Side}',
      title: 'Report 7 on {Marram, ebb 3.3}: counts of defects held against independent trials',
      year: '2031',
      month: 'feb',
      howpublished: '\\texttt{https://lab.example.org/\\allowbreak{}link/\\allowbreak{}aB\\_-c}',
      url: 'https://lab.example.org/link/aB_-c',
      note: `Document sha256 ${broken('5f'.repeat(32))}, counts sha256 ${broken('1a'.repeat(32))}, Severalty engine 0.2.0`
    });
  });

  it('of a blind report names nobody, and of a result of one browser no address', () => {
    const { key, fields } = fieldsOf(bibtex(quotable, { ...NO_PROVENANCE, sha256: whole.sha256 }));
    expect(key).toBe('severaltyx5f5f5f5f');
    expect(Object.keys(fields)).toEqual(['author', 'title', 'note']);
    expect(fields.author).toBe('{Severalty report}');
  });

  it('without any digest has the address in its key', () => {
    const { key, fields } = fieldsOf(
      bibtex({ ...quotable, data: { ...quotable.data, digest: null } }, { ...NO_PROVENANCE, url: whole.url })
    );
    expect(key).toBe('severaltyxglinkaBc');
    expect(fields.note).toBe('Severalty engine 0.2.0');
  });

  it('is well formed whatever people are called', () => {
    const name = fc.string({
      unit: fc.oneof(
        fc.constantFrom(...'{}\\"@,%#~ and\n'),
        fc.string({ unit: 'grapheme', minLength: 1, maxLength: 1 })
      ),
      minLength: 1
    });
    fc.assert(
      fc.property(name, name, (team, dataset) => {
        const { key, fields } = fieldsOf(bibtex(quotable, { ...whole, team, name: dataset }));
        expect(key).toMatch(/^[A-Za-z0-9]+$/);
        expect(Object.keys(fields)).toHaveLength(7);
        // In braces of its own: no style takes "and" for two people.
        expect(fields.author).toMatch(/^\{.*\}$/s);
      }),
      { numRuns: 2000 }
    );
  });
});

const broken = (hex: string) => `\\texttt{${hex.match(/.{8}/g)!.join('\\allowbreak{}')}}`;
