/** A text string of the file: UTF-16 with its mark, or latin. */
export function textOf(object: string, key: string): string {
  const raw = object.match(new RegExp(`/${key} \\(((?:\\\\[\\s\\S]|[^\\\\)])*)\\)`))?.[1] ?? '';
  const bytes = Buffer.from(raw.replace(/\\([\s\S])/g, '$1'), 'latin1');
  if (bytes[0] !== 0xfe || bytes[1] !== 0xff) return bytes.toString('latin1');
  return Buffer.from(bytes.subarray(2)).swap16().toString('utf16le');
}
