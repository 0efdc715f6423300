/** Stands in for `draw-figure.ts` in a browser, which keeps what the server drew or makes the chart itself. */
export const drawFigure = (): string => '';
