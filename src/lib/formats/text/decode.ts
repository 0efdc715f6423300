import type { Encoding, Guess, Problem } from '../types';
import { recogniseBinary } from './recognise-binary';

export type Decoded =
  | { ok: true; text: string; encoding: Guess<Encoding> }
  | { ok: false; problem: Problem; encoding: Guess<Encoding> | null };

const refuse = (message: string, fix: string, line: number | null = null): Decoded => ({
  ok: false,
  problem: { line, column: null, message, fix },
  encoding: null
});

/** Control characters no table contains: all of C0 but tab, line feed, form feed and return. */

const control = /[\u0000-\u0008\u000b\u000e-\u001f]/;

const saveAsCsv = 'Save the counts as plain text (CSV, UTF-8) and give that file.';

/** UTF-16 without a mark: every other byte of the first 2000 is zero and no other one is. */
function looksLikeUtf16(bytes: Uint8Array): Encoding | null {
  const end = Math.min(bytes.length, 2000) & ~1;
  if (end < 4) return null;
  let evenZeros = 0;
  let oddZeros = 0;
  for (let index = 0; index < end; index += 2) {
    if (bytes[index] === 0) evenZeros += 1;
    if (bytes[index + 1] === 0) oddZeros += 1;
  }
  if (evenZeros === 0 && oddZeros > 0.45 * end) return 'utf-16le';
  if (oddZeros === 0 && evenZeros > 0.45 * end) return 'utf-16be';
  return null;
}

function chooseEncoding(bytes: Uint8Array): Guess<Encoding> {
  const [first, second] = bytes;
  const marked = 'the file opens with the byte-order mark of this encoding';
  if (first === 0xff && second === 0xfe) return { value: 'utf-16le', from: 'stated', why: marked };
  if (first === 0xfe && second === 0xff) return { value: 'utf-16be', from: 'stated', why: marked };
  if (first === 0xef && second === 0xbb && bytes[2] === 0xbf)
    return { value: 'utf-8', from: 'stated', why: marked };
  const wide = looksLikeUtf16(bytes);
  if (wide) return { value: wide, from: 'guessed', why: 'every other byte is zero' };
  return { value: 'utf-8', from: 'guessed', why: 'the usual encoding' };
}

function strictly(bytes: Uint8Array, encoding: Encoding): string | null {
  try {
    return new TextDecoder(encoding, { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}

/**
 * Turns bytes into text, or says why they are none.
 *
 * UTF-8 and UTF-16 are read strictly. Bytes that are no UTF-8 but otherwise look like text are
 * read as windows-1252, which spreadsheet programs in Western Europe still write ("Häufigkeit");
 * that is reported as a guess, and cannot change a digit. Anything with NUL or other control
 * characters is refused as binary.
 */
export function decode(bytes: Uint8Array, given?: Encoding): Decoded {
  const known = recogniseBinary(bytes);
  if (known) return refuse(`This is ${known.name}, not a text file.`, known.fix);
  let encoding: Guess<Encoding> = given
    ? { value: given, from: 'given', why: 'as you said' }
    : chooseEncoding(bytes);
  let text = strictly(bytes, encoding.value);
  if (text === null && !given && encoding.value === 'utf-8' && encoding.from === 'guessed') {
    const other = strictly(bytes, 'windows-1252');
    if (other !== null && !control.test(other) && !mostlyForeign(bytes)) {
      text = other;
      encoding = { value: 'windows-1252', from: 'guessed', why: 'the bytes are not UTF-8' };
    }
  }
  if (text === null) {
    const broken = new TextDecoder(encoding.value).decode(bytes);
    const line = lineAt(broken, broken.indexOf('\ufffd'));
    return refuse(
      `The bytes are not text in ${encoding.value}: this looks like a binary file.`,
      saveAsCsv,
      line
    );
  }
  const stray = control.exec(text);
  if (stray) {
    return refuse(
      'There are control characters in the text: this looks like a binary file.',
      saveAsCsv,
      lineAt(text, stray.index)
    );
  }
  return { ok: true, text: text.replace(/^\ufeff/, ''), encoding };
}

/** Line of an offset in a text whose line ends may be of any kind. */
function lineAt(text: string, offset: number): number {
  return text.slice(0, Math.max(0, offset)).split(/\r\n?|\n/).length;
}

/** More than a tenth of the bytes beyond ASCII: no table of numbers in a Western encoding. */
function mostlyForeign(bytes: Uint8Array): boolean {
  let foreign = 0;
  for (const byte of bytes) if (byte > 127) foreign += 1;
  return foreign > Math.max(10, bytes.length / 10);
}
