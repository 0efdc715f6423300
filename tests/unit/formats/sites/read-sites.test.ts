import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { maxSites } from '$lib/formats/sites/limits';
import { readSites } from '$lib/formats/sites/read-sites';

const unpack = (row: Uint8Array, sites: number) =>
  Array.from({ length: sites }, (_, i) => (row[i >> 3] >> (i & 7)) & 1);

function read(text: string) {
  const reading = readSites(text);
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  return { sites: reading.sites, shots: reading.shots.map((row) => unpack(row, reading.sites.length)) };
}

function refusal(text: string) {
  const reading = readSites(text);
  if (reading.ok) throw new Error('was read');
  return reading.problems[0];
}

const tables = fc.integer({ min: 2, max: 40 }).chain((width) =>
  fc.array(fc.array(fc.constantFrom(0, 1), { minLength: width, maxLength: width }), {
    minLength: 1,
    maxLength: 9
  })
);

describe('site-resolved shots', () => {
  it('come back as they were written, with any separator, line end and as bit strings', () => {
    const marks = fc.constantFrom(',', ';', '\t', ' ', '', ', ');
    fc.assert(
      fc.property(
        tables,
        marks,
        fc.constantFrom('\n', '\r\n', '\r'),
        fc.boolean(),
        (shots, mark, end, named) => {
          const header = named && mark !== '' ? shots[0].map((_, i) => `q${i}`).join(mark) + end : '';
          const found = read(header + shots.map((row) => row.join(mark)).join(end) + end);
          expect(found.shots).toEqual(shots);
          expect(found.sites).toEqual(shots[0].map((_, i) => (header ? `q${i}` : String(i + 1))));
        }
      )
    );
  });

  it('may stand behind columns of shot and batch', () => {
    expect(read('shot,batch,a,b,c\n1,9,0,1,1\n2,9,1,0,0\n')).toEqual({
      sites: ['a', 'b', 'c'],
      shots: [
        [0, 1, 1],
        [1, 0, 0]
      ]
    });
    expect(read('shot bits\n17 0110\n18 1111').shots).toEqual([
      [0, 1, 1, 0],
      [1, 1, 1, 1]
    ]);
  });

  it('pass over blank lines and comments, and take bits in groups', () => {
    expect(read('# device A\n\n0101 1\n1100 0\n').shots).toEqual([
      [0, 1, 0, 1, 1],
      [1, 1, 0, 0, 0]
    ]);
  });

  it('are refused at the line and column of anything but 0 and 1', () => {
    expect(refusal('0,1,0\n0, 2,1\n')).toMatchObject({ line: 2, column: 4 });
    expect(refusal('0101\n01x1\n')).toMatchObject({ line: 2, column: 3 });
    expect(refusal('0,1\n1,\n')).toMatchObject({
      line: 2,
      message: 'Site 2 of this shot is nothing, neither 0 nor 1.'
    });
  });

  it('are refused at a bad first shot, which is no header', () => {
    expect(refusal('01x1\n0101\n')).toMatchObject({ line: 1, column: 3 });
    expect(refusal('x,0,1\n0,1,1\n')).toMatchObject({ line: 1, column: 1 });
    expect(refusal('shot\n1\n').message).toBe('There are no sites.');
  });

  it('are refused when ragged, empty, of one site or of too many', () => {
    expect(refusal('010\n01\n')).toMatchObject({
      line: 2,
      message: expect.stringContaining('rows above have 3')
    });
    expect(refusal('# nothing\n').message).toBe('There are no shots.');
    expect(refusal('a,b\n').message).toBe('There are no shots.');
    expect(refusal('0\n1\n').message).toBe('There is one site only.');
    expect(refusal('0'.repeat(maxSites + 1)).message).toContain(`limit is ${maxSites}`);
    expect(read('0'.repeat(maxSites)).sites).toHaveLength(maxSites);
  });

  it('are refused when the header names other sites than the shots have, or one twice', () => {
    expect(refusal('a,b,c\n0,1\n').message).toBe('The header names 3 sites; the shots have 2.');
    expect(refusal('a,a\n0,1\n').message).toContain('there twice');
  });
});
