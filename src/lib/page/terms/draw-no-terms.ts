/** Stands in for `draw-terms.ts` in a browser, which keeps what the server drew or loads the terms itself. */
export const drawTerms = (): string => '';
