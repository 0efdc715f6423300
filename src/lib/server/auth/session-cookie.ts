/**
 * Name and marks of the session cookie. Under https the name's prefix makes browsers refuse it from elsewhere (RFC
 * 6265bis): no other host of the domain can plant one.
 */
export function sessionCookie(secure: boolean) {
  return {
    name: secure ? '__Host-severalty-session' : 'severalty-session',
    options: { httpOnly: true, sameSite: 'lax' as const, path: '/', secure }
  };
}
