type Listener = (jobId: string) => void;

/** On globalThis, since a development server loads this file anew at every change. */
const holder = globalThis as { [listeners: symbol]: Map<string, Set<Listener>> | undefined };
const teams = (holder[Symbol.for('severalty.job-listeners')] ??= new Map<string, Set<Listener>>());

/**
 * Hears of every change to a job of a team that this process makes. What another process on the same database does is
 * not heard: look there now and then.
 *
 * @returns stops hearing
 */
export function onJobChange(teamId: string, listener: Listener): () => void {
  const listeners = teams.get(teamId) ?? new Set();
  teams.set(teamId, listeners.add(listener));
  return () => {
    listeners.delete(listener);
    if (listeners.size === 0 && teams.get(teamId) === listeners) teams.delete(teamId);
  };
}

/** Tells those who listen to a team that one of its jobs changed; its row says how. */
export function tellJobChange(teamId: string, jobId: string): void {
  for (const listener of [...(teams.get(teamId) ?? [])]) listener(jobId);
}
