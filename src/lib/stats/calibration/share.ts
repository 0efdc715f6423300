import { clopperPearson } from '../numerics/clopper-pearson';

/** A share with its exact 95 % interval. */
export interface Share {
  hits: number;
  of: number;
  share: number | null;
  low: number;
  high: number;
}

/** `hits` out of `of`, with the Clopper–Pearson interval at 95 %; 0 … 1 and no share when nothing was counted. */
export function share(hits: number, of: number): Share {
  return { hits, of, share: of > 0 ? hits / of : null, ...clopperPearson(hits, of) };
}
