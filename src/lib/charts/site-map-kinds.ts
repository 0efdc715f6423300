import type { MappedPair, SitesReport } from '$lib/stats/sites/sites-types';

/** What a pair of a map is drawn as. */
export type PairKind = 'risen' | 'fallen' | 'unread' | 'above' | 'below';

/** Pairs of one kind that are drawn at most: the strongest, in an ink of their own each. */
const MOST = 400;

export interface DrawnPairs {
  kinds: { pair: MappedPair; kind: PairKind }[];
  /** Pairs left out because there were too many, and because one of their sites never changes. */
  left: number;
  unknown: number;
}

/**
 * The pairs of a map that are drawn: those that were found, as a rise or a fall, or as nothing that can be read one by one
 * where all sites move together or avoid each other; and those that were not found, but whose own interval leaves 0.
 */
export function siteMapKinds({
  pairs,
  alpha,
  common
}: Pick<SitesReport, 'pairs' | 'alpha' | 'common'>): DrawnPairs {
  const found = pairs.filter(({ pHolm }) => pHolm <= alpha).length;
  const unread = common.shown && found !== 1;
  const kindOf = ({ pHolm, correlation, low, high }: MappedPair): PairKind | null => {
    if (correlation === null) return null;
    if (pHolm <= alpha) return unread ? 'unread' : correlation > 0 ? 'risen' : 'fallen';
    if (low !== null && low > 0) return 'above';
    return high !== null && high < 0 ? 'below' : null;
  };
  const all = pairs.flatMap((pair) => {
    const kind = kindOf(pair);
    return kind ? [{ pair, kind }] : [];
  });
  const size = (one: (typeof all)[number]) => Math.abs(one.pair.correlation ?? 0);
  const kinds = (['above', 'below', 'unread', 'fallen', 'risen'] as const).flatMap((kind) =>
    all
      .filter((one) => one.kind === kind)
      .sort((a, b) => size(b) - size(a))
      .slice(0, MOST)
  );
  return {
    kinds,
    left: all.length - kinds.length,
    unknown: pairs.filter(({ correlation }) => correlation === null).length
  };
}
