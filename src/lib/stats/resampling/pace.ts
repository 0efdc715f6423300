/** Lets a long calculation breathe: progress reports, cancellation, and turns for the event loop. */
export interface Pace {
  /** Call as often as you like; every 30 ms or so it yields. Rejects when the calculation was cancelled. */
  breathe(share: number): Promise<void>;
}

/** A pace that never yields, for tests and for callers that run to the end. */
export const unbroken: Pace = { breathe: async () => {} };
