const lineFeed = 10;
const carriageReturn = 13;

/** The next place that is neither a space nor a tab. */
export function afterBlanks(bytes: Uint8Array, from: number): number {
  let at = from;
  while (bytes[at] === 32 || bytes[at] === 9) at += 1;
  return at;
}

/** Where the line ends; without `decoded` already at a byte that is no printable ASCII. */
export function endOfComment(bytes: Uint8Array, from: number, decoded: boolean): number {
  let at = from;
  for (; at < bytes.length; at += 1) {
    const code = bytes[at];
    if (code === lineFeed || code === carriageReturn) break;
    if (!decoded && (code > 126 || (code < 32 && code !== 9))) break;
  }
  return at;
}

/** The start of the next line, from a line end of any kind. */
export function afterLineEnd(bytes: Uint8Array, at: number): number {
  return at + (bytes[at] === carriageReturn && bytes[at + 1] === lineFeed ? 2 : 1);
}
