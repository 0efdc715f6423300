/** An object as the bytes of a JSON file: indented by two spaces, one line end at the close. */
export function jsonBytes(value: unknown): Uint8Array {
  return new TextEncoder().encode(`${JSON.stringify(value, null, 2)}\n`);
}
