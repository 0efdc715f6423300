import fc from 'fast-check';
import { deflateRawSync } from 'node:zlib';
import { zipSync } from 'fflate';
import { LIMITS } from '$lib/server/services/transfer/limits';
import { openArchive } from '$lib/server/services/transfer/open-archive';
import { describe, expect, it } from 'vitest';
import { localFile, zipOfClaims, type Claim } from '../../../../support/zip-by-hand';

const original = (i: number) => `originals/${i.toString(16).padStart(64, '0')}`;

/** What is said of it; and that no more than `room` bytes were taken outside the heap on the way. */
function refusalOf(bytes: Uint8Array, room = 8_000_000) {
  const before = process.memoryUsage().arrayBuffers;
  const answer = openArchive(bytes);
  expect(process.memoryUsage().arrayBuffers - before).toBeLessThan(room);
  if (answer.ok) throw new Error('it was taken');
  expect(answer.what).toMatch(/^[^\p{Cc}\p{Cf}\p{Cs}]{10,250}\.$/u);
  return answer;
}

/** Entries that all claim the same bytes. */
function overlapping(entries: number, claim: Omit<Claim, 'name' | 'at'>, body: Uint8Array): Uint8Array {
  const claims = Array.from({ length: entries }, (_, i) => ({ ...claim, name: original(i), at: 0 }));
  return zipOfClaims(body, claims);
}

describe('a zip that was made to fill the memory', () => {
  it('stored files of a million bytes that claim none, three hundred over one another', () => {
    const body = localFile(original(0), new Uint8Array(1_000_000));
    const packed = { packed: 1_000_000, unpacked: 0 };
    expect(refusalOf(overlapping(300, packed, body)).what).toContain('not as long as');
  });

  it('the same with claims that are true', () => {
    const body = localFile(original(0), new Uint8Array(1_000_000));
    const bomb = overlapping(200, { packed: 1_000_000, unpacked: 1_000_000 }, body);
    expect(refusalOf(bomb).what).toContain('another name');
    const one = { name: original(0), at: 0, packed: 1_000_000, unpacked: 1_000_000 };
    expect(refusalOf(zipOfClaims(body, [one, one])).what).toContain('twice');
  });

  it('files that share bytes, each with a header of its own within the one before', () => {
    // A stored file whose bytes are the header and the bytes of the next one (Fifield 2019, "A better zip bomb").
    const inner = localFile(original(1), new Uint8Array(500_000));
    const outer = localFile(original(0), inner);
    const at = outer.length - inner.length;
    const bomb = zipOfClaims(outer, [
      { name: original(0), at: 0, packed: inner.length, unpacked: inner.length },
      { name: original(1), at, packed: 500_000, unpacked: 500_000 }
    ]);
    expect(refusalOf(bomb).what).toContain('lies over another');
  });

  it('a file that inflates to a thousand times what it claims is given up at the first byte beyond', () => {
    const zeros = new Uint8Array(50_000_000);
    const body = localFile(original(0), zeros, 8);
    const packed = deflateRawSync(zeros, { level: 9 }).length;
    const claim = { name: original(0), at: 0, packed, unpacked: 60_000, method: 8 };
    expect(refusalOf(zipOfClaims(body, [claim])).what).toContain('does not unpack to what');
    expect(refusalOf(zipOfClaims(body, [{ ...claim, unpacked: 50_000_000 }])).reason).toBe('too-large');
    expect(refusalOf(zipOfClaims(body, [{ ...claim, unpacked: 0 }])).reason).toBe('damaged');
  });

  it('gigabytes claimed of a few kilobytes, by one file or by many', () => {
    const body = localFile(original(0), new Uint8Array(100), 8);
    const claim = { name: original(0), at: 0, packed: 10, unpacked: 0xfffffffe, method: 8 };
    expect(refusalOf(zipOfClaims(body, [claim])).reason).toBe('too-large');
    const many = Array.from({ length: 300 }, (_, i) => ({
      ...claim,
      name: original(i),
      unpacked: LIMITS.ratioFrom
    }));
    const local = Buffer.concat(many.map(({ name }) => localFile(name, new Uint8Array(100), 8)));
    const size = local.length / 300;
    const apart = many.map((one, i) => ({ ...one, at: i * size }));
    expect(refusalOf(zipOfClaims(local, apart)).what).toContain('unpack to more than');
  });

  it('a zip within a zip stays a file: it is of another name, or not what its sum says', () => {
    const nested = zipSync({ 'a.zip': zipSync({ 'b.zip': zipSync({ c: new Uint8Array(1000) }) }) });
    expect(refusalOf(nested).reason).toBe('not-an-archive');
    expect(refusalOf(zipSync({ [original(1)]: nested })).what).toContain('no manifest');
  });

  it('more entries than are there, and fewer', () => {
    const body = localFile(original(0), new Uint8Array(3));
    const claim = { name: original(0), at: 0, packed: 3, unpacked: 3 };
    expect(refusalOf(zipOfClaims(body, [claim], { entries: 65_535 })).what).toContain('fewer files');
    expect(refusalOf(zipOfClaims(body, [claim], { entries: 0 })).what).toContain('more files');
    expect(refusalOf(zipOfClaims(body, [claim], { directoryAt: 0 })).what).toContain('directory');
    expect(refusalOf(zipOfClaims(body, [{ ...claim, at: 9e6 }])).what).toContain('is not where');
    expect(refusalOf(zipOfClaims(body, [{ ...claim, packed: 9e6, unpacked: 9e6 }])).reason).toBe('damaged');
    expect(refusalOf(zipOfClaims(body, [{ ...claim, packed: 0xffffffff }])).what).toContain('wider form');
    expect(refusalOf(zipOfClaims(body, [{ ...claim, method: 14 }])).what).toContain('packed in a way');
  });
});

describe('names of files', () => {
  it.each([
    '../../etc/passwd',
    '/etc/passwd',
    'C:\\boot.ini',
    '..\\x',
    'originals/../team.json',
    'team.json\0.txt',
    'TEAM.JSON',
    'team.json/',
    './team.json',
    'datasets/00001.json\n',
    'datasets/\u202e10000.json',
    '',
    `originals/${'a'.repeat(60_000)}`,
    '__proto__',
    'constructor',
    Uint8Array.of(0xff, 0xfe)
  ])('number %# is of no archive, and is told without its signs', (name) => {
    const body = localFile('team.json', new Uint8Array(3));
    const claims = [{ name, at: 0, packed: 3, unpacked: 3 }];
    expect(refusalOf(zipOfClaims(body, claims)).reason).toBe('not-an-archive');
  });

  it('that differ between the directory and the file itself', () => {
    const body = localFile('events.json', new Uint8Array(3));
    const claims = [{ name: 'team.json', at: 0, packed: 3, unpacked: 3 }];
    expect(refusalOf(zipOfClaims(body, claims)).what).toContain('another name');
  });
});

describe('whatever bytes come', () => {
  const entry = fc.record({
    name: fc.constantFrom('manifest.json', 'team.json', original(0), original(1), '../x'),
    at: fc.constantFrom(0, 1, 46, 1000, 0xfffffffe),
    packed: fc.constantFrom(0, 3, 60, 5000, 0xffffffff),
    unpacked: fc.constantFrom(0, 3, 60, 70_000_000, 0xffffffff),
    method: fc.constantFrom(0, 8, 8, 12)
  });
  const claimed = fc
    .tuple(
      fc.array(entry, { maxLength: 4 }),
      fc.record({ entries: fc.nat(5), directoryAt: fc.nat(300) }, { requiredKeys: [] })
    )
    .map(([claims, more]) => zipOfClaims(localFile('team.json', new Uint8Array(60), 8), claims, more));
  const good = zipSync({ 'manifest.json': new Uint8Array(40), 'team.json': new Uint8Array(40) });
  const bent = fc
    .array(fc.tuple(fc.nat(good.length - 1), fc.nat(255)), { minLength: 1, maxLength: 5 })
    .map((edits) => {
      const bytes = good.slice();
      for (const [at, value] of edits) bytes[at] = value;
      return bytes;
    });
  const anything = fc.uint8Array({ maxLength: 200 }).map((rest) => Uint8Array.from([0x50, 0x4b, ...rest]));

  it.each([
    ['claims of every kind', claimed],
    ['a zip with bytes changed', bent],
    ['bytes that begin as a zip does', anything]
  ])('%s: refused in words', (_, arbitrary) => {
    fc.assert(
      fc.property(arbitrary, (bytes) => void refusalOf(bytes, 1e9)),
      { numRuns: 2000 }
    );
  });
});
