/** On globalThis, since the start command and the built server are two bundles in one process. */
interface Stopping {
  begun: boolean;
  listeners: Set<() => void>;
}
const holder = globalThis as { [stopping: symbol]: Stopping | undefined };
const state = (holder[Symbol.for('severalty.stopping')] ??= { begun: false, listeners: new Set() });

/** Whether this process was told to end: it still answers, and should be sent nothing new. */
export const isStopping = (): boolean => state.begun;

/** Tells everything that would go on for ever, such as a stream of events, to end. */
export function beginStopping(): void {
  state.begun = true;
  for (const listener of [...state.listeners]) listener();
  state.listeners.clear();
}

/**
 * Hears of the end of this process, at once where it has begun.
 *
 * @returns stops hearing
 */
export function onStopping(listener: () => void): () => void {
  if (state.begun) listener();
  else state.listeners.add(listener);
  return () => void state.listeners.delete(listener);
}
