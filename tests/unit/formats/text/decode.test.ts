import { describe, expect, it } from 'vitest';
import { decode } from '$lib/formats/text/decode';

const table = 'Anzahl;Häufigkeit\n0;12\n';
const wide = (text: string, little: boolean, mark: boolean) => {
  const units = [...(mark ? '\ufeff' : ''), ...text].map((character) => character.charCodeAt(0));
  return new Uint8Array(
    units.flatMap((unit) => (little ? [unit & 255, unit >> 8] : [unit >> 8, unit & 255]))
  );
};
const bytes = (...parts: (string | number)[]) =>
  new Uint8Array(
    parts.flatMap((part) => (typeof part === 'number' ? [part] : [...new TextEncoder().encode(part)]))
  );

describe('decode', () => {
  it('takes the byte-order mark off UTF-8', () => {
    expect(decode(bytes(0xef, 0xbb, 0xbf, table))).toMatchObject({
      ok: true,
      text: table,
      encoding: { value: 'utf-8', from: 'stated' }
    });
  });

  it.each([
    [true, true, 'stated'],
    [false, true, 'stated'],
    [true, false, 'guessed'],
    [false, false, 'guessed']
  ])('reads UTF-16 (little end first: %s, mark: %s)', (little, mark, from) => {
    const ascii = 'count;shots\n0;12\n';
    expect(decode(wide(ascii, little, mark))).toMatchObject({
      ok: true,
      text: ascii,
      encoding: { value: little ? 'utf-16le' : 'utf-16be', from }
    });
  });

  it('reads what a Western spreadsheet wrote, and says that it guessed', () => {
    const latin = new Uint8Array([...table].map((character) => character.charCodeAt(0)));
    expect(decode(latin)).toMatchObject({
      ok: true,
      text: table,
      encoding: { value: 'windows-1252', from: 'guessed' }
    });
    expect(decode(latin, 'utf-8').ok).toBe(false);
  });

  it('refuses control characters with their line', () => {
    const decoded = decode(bytes('0,1\n1,', 0, '2\n'));
    expect(decoded).toMatchObject({ ok: false, problem: { line: 2 } });
  });

  it('refuses bytes that are no text', () => {
    expect(decode(new Uint8Array(Array.from({ length: 400 }, (_, index) => 128 + (index % 128)))).ok).toBe(
      false
    );
    expect(decode(bytes('0,12\n', 255, 254, 1)).ok).toBe(false);
  });

  it.each([
    ['PK\u0003\u0004', 'workbook'],
    ['%PDF-1.7', 'PDF'],
    ['{\\rtf1', 'rich-text'],
    ['SQLite format 3', 'SQLite']
  ])('names %j', (start, word) => {
    const decoded = decode(bytes(start, 'rest'));
    expect(decoded.ok).toBe(false);
    if (!decoded.ok) expect(decoded.problem.message).toContain(word);
  });

  it('names a PNG by its bytes and says what to do', () => {
    const decoded = decode(bytes(0x89, 'PNG'));
    expect(decoded).toMatchObject({ ok: false, problem: { message: expect.stringContaining('PNG') } });
  });
});
