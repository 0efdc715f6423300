/** Signs made of bytes at a time: more arguments than this a call may not have. */
const CHUNK = 0x2000;

/** Bytes as base64, by what server and browser both have. */
export function textOfBytes(bytes: Uint8Array): string {
  let signs = '';
  for (let at = 0; at < bytes.length; at += CHUNK)
    signs += String(Reflect.apply(String.fromCharCode, null, bytes.subarray(at, at + CHUNK)));
  return btoa(signs);
}

export function bytesOfText(text: string): Uint8Array<ArrayBuffer> {
  const signs = atob(text);
  const bytes = new Uint8Array(signs.length);
  for (let i = 0; i < signs.length; i++) bytes[i] = signs.charCodeAt(i);
  return bytes;
}
