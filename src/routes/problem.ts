/** Problem details of RFC 9457, which JSON routes answer with when they refuse. */
export interface Problem {
  status: number;
  /** Short name for scripts: `not-allowed`, `stale`, `bad-input` … */
  code: string;
  /** One sentence for people. */
  title: string;
  detail?: string;
  /** More facts, such as the problems of a file. */
  [more: string]: unknown;
}

export function problem({ status, ...rest }: Problem): Response {
  return new Response(JSON.stringify({ type: 'about:blank', status, ...rest }), {
    status,
    headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' }
  });
}
