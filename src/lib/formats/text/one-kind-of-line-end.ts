/** A text with `\n` for every line end, whether it was `\n`, `\r\n` or `\r`. */
export function oneKindOfLineEnd(text: string): string {
  return text.includes('\r') ? text.replace(/\r\n?/g, '\n') : text;
}
