/** What a JSON route refused, in its own words; `body` holds whatever else it said. */
export class Refused extends Error {
  override readonly name = 'Refused';
  constructor(
    readonly status: number,
    readonly code: string,
    title: string,
    readonly body: Record<string, unknown> = {}
  ) {
    super(title);
  }
}

/** Said where no answer came at all. */
export const NO_ANSWER = 'The server did not answer. Nothing is lost; try again when the network is back.';

/**
 * Asks a JSON route of ours.
 *
 * @throws Refused with one sentence for people, also when nothing or no JSON came back
 */
export async function fetchJson<Answer>(address: string, init: RequestInit = {}): Promise<Answer> {
  let response: Response;
  try {
    response = await fetch(address, { ...init, headers: { accept: 'application/json', ...init.headers } });
  } catch {
    throw new Refused(0, 'no-answer', NO_ANSWER);
  }
  const body: unknown = await response.json().catch(() => null);
  if (response.ok && body !== null) return body as Answer;
  const told = (body ?? {}) as Record<string, unknown>;
  const sentence = [told.title, told.detail].filter((text) => typeof text === 'string').join(' ');
  const said =
    sentence || (response.status === 413 ? 'That is more than the server takes at once: 20 MB.' : '');
  throw new Refused(
    response.status,
    typeof told.code === 'string' ? told.code : 'failed',
    said || `The server answered with ${response.status}. Nothing was saved.`,
    told
  );
}
