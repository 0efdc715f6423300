/** A file to be saved under a name, which may hold letters of any script (RFC 6266). */
export function attachment(body: BodyInit, name: string, type: string): Response {
  const plain = name.replace(/[^\x20-\x7e]|["\\%]/g, '_');
  return new Response(body, {
    headers: {
      'content-type': type,
      'content-disposition': `attachment; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(name).replace(/['()*]/g, (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`)}`,
      'cache-control': 'private, no-store'
    }
  });
}
