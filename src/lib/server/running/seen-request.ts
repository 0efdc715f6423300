import { AsyncLocalStorage } from 'node:async_hooks';

/** What is known of the request in hand, for its line in the log and its place in the metrics. */
export interface SeenRequest {
  /** Answered as X-Request-Id, and told where something is refused. */
  readonly id: string;
  /** Template of the route, `/team/[team=slug]`; null: no route has it; undefined: it did not come as far as routes. */
  route?: string | null;
  /** Ids of who asked and of the team that was asked for: never names or addresses. */
  person?: string;
  team?: string;
  /** Id of the token that a script came with. */
  token?: string;
}

/** On globalThis, since the start command and the built server are two bundles in one process. */
const holder = globalThis as { [seen: symbol]: AsyncLocalStorage<SeenRequest> | undefined };
const storage = (holder[Symbol.for('severalty.request')] ??= new AsyncLocalStorage<SeenRequest>());

/** Runs `act`, and all that it begins, as part of a request. */
export function inRequest<Result>(seen: SeenRequest, act: () => Result): Result {
  return storage.run(seen, act);
}

/** The request in hand; undefined in what runs by itself. */
export const seenRequest = (): SeenRequest | undefined => storage.getStore();

/** For work that a request only sets going: its lines in the log are not the request's. */
export function outsideRequest<Result>(act: () => Result): Result {
  return storage.exit(act);
}

/** Adds who asked for what. */
export function noteRequest(facts: Partial<Omit<SeenRequest, 'id'>>): void {
  const seen = storage.getStore();
  if (seen) Object.assign(seen, facts);
}
