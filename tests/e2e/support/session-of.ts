/** Signs in without a browser and gives the cookie header of the session. */
export async function sessionOf(address: string, email: string, password: string): Promise<string> {
  const response = await fetch(`${address}/sign-in`, {
    method: 'POST',
    body: new URLSearchParams({ email, password }),
    headers: { origin: address, accept: 'text/html' },
    redirect: 'manual'
  });
  if (response.status !== 303) throw new Error(`Signing in was answered with ${response.status}.`);
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}
