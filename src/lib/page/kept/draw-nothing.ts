/** Stands in for `draw-spot.ts` and `draw-still.ts` in a browser, which keeps what the server drew or makes it itself. */
export const drawSpot = (): string => '';
export const drawStill = (): string => '';
