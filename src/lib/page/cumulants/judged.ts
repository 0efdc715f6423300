import type { CumulantsVerdict } from '$lib/stats/cumulants-only/judge-cumulants';
import type { PublishedCumulants } from '$lib/stats/cumulants-only/published-cumulants';

/** A line of a table and what was found. */
export interface Judged {
  /** What of it was judged (withErrors). */
  printed: PublishedCumulants;
  verdict: CumulantsVerdict;
  statement: string;
  /** The part of the address that opens it. */
  address: string;
}

/** Judges in the page itself, which takes milliseconds; the engine's part is fetched on first use. */
export async function judge(printed: PublishedCumulants, address: string): Promise<Judged> {
  const [{ judgeCumulants }, { sayCumulants }, { withErrors }, { sayLeftOut }] = await Promise.all([
    import('$lib/stats/cumulants-only/judge-cumulants'),
    import('$lib/stats/cumulants-only/say-cumulants'),
    import('$lib/stats/cumulants-only/with-errors'),
    import('$lib/stats/cumulants-only/say-left-out')
  ]);
  const judged = withErrors(printed);
  const verdict = judgeCumulants(judged);
  return { printed: judged, verdict, statement: sayCumulants(verdict) + sayLeftOut(printed), address };
}
