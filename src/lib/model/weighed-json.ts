/** Levels of brackets; what is read here needs a dozen. */
const DEPTH = 64;
/** A list or an object takes about as much memory as this many numbers: 60 bytes and more, beside 8. */
const BRACKET = 10;

/** Heaviest JSON a request may send: a sweep of a thousand datasets weighs 1100, an edit of ten thousand 10 000. */
export const REQUEST_WEIGHT = 200_000;

export type WeighedJson = { ok: true; value: unknown } | { ok: false; why: string };

/**
 * The value of a JSON text (RFC 8259) that is weighed before it is read: 20 MB of brackets within the limit of bytes
 * kept JSON.parse busy for 8 s with 600 MB, and a schema makes an object of every value that does not fit (800 bytes).
 * Weight is the number of values, lists and objects counting as ten.
 *
 * @param bytes UTF-8, with or without a mark of order
 * @returns `why` as a sentence
 */
export function weighedJson(bytes: Uint8Array, most = REQUEST_WEIGHT): WeighedJson {
  const heavy = weigh(bytes, most);
  if (heavy) return { ok: false, why: heavy };
  try {
    return { ok: true, value: JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes)) };
  } catch {
    return { ok: false, why: 'It is not JSON.' };
  }
}

const [QUOTE, COMMA, BACKSLASH] = [0x22, 0x2c, 0x5c];
const [SQUARE, SQUARE_END, CURLY, CURLY_END] = [0x5b, 0x5d, 0x7b, 0x7d];

/** Why it is not read, or null. What is no JSON may be told as anything: it is refused either way. */
function weigh(bytes: Uint8Array, most: number): string | null {
  let weight = 1;
  let depth = 0;
  let quoted = false;
  for (let i = 0; i < bytes.length; i += 1) {
    const byte = bytes[i];
    if (quoted) {
      if (byte === BACKSLASH) i += 1;
      else if (byte === QUOTE) quoted = false;
    } else if (byte === QUOTE) quoted = true;
    else if (byte === COMMA) weight += 1;
    else if (byte === SQUARE || byte === CURLY) {
      weight += BRACKET;
      depth += 1;
      if (depth > DEPTH) return `Brackets are nested more than ${DEPTH} deep.`;
    } else if (byte === SQUARE_END || byte === CURLY_END) depth -= 1;
    if (weight > most) return 'It holds more values than anything that is read here.';
  }
  return null;
}
