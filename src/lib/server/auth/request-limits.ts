import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';

/** Requests, in how many seconds. Five a second carry a script that waits for a job; a loop gone wild is slowed. */
export const REQUEST_LIMITS = {
  /** Of one token. */
  token: { quota: 300, window: 60 },
  /** From one network with no token that opens anything. */
  unknown: { quota: 60, window: 60 }
} as const;

/** Requests that a PDF or a zip counts as: it takes half a second of one core, a JSON answer a few milliseconds. */
export const FILE_COST = 10;

export type RequestLimit = keyof typeof REQUEST_LIMITS;

export interface SpentRequest {
  ok: boolean;
  /** Requests left in this window. */
  left: number;
  /** Seconds until the window ends, 1 or more. */
  seconds: number;
}

/** The counts live in memory, as those of signing in do: a restart forgets them. `cost` is as how many requests one counts. */
export function makeRequestLimits(limits: Record<RequestLimit, { quota: number; window: number }>) {
  const make = (name: RequestLimit) =>
    new RateLimiterMemory({ keyPrefix: name, points: limits[name].quota, duration: limits[name].window });
  const limiters = { token: make('token'), unknown: make('unknown') };
  return async (limit: RequestLimit, key: string, cost = 1): Promise<SpentRequest> => {
    const spent = (res: RateLimiterRes, ok: boolean): SpentRequest => ({
      ok,
      left: Math.max(0, res.remainingPoints),
      seconds: Math.max(1, Math.ceil(res.msBeforeNext / 1000))
    });
    try {
      return spent(await limiters[limit].consume(key, cost), true);
    } catch (refused) {
      if (!(refused instanceof RateLimiterRes)) throw refused;
      return spent(refused, false);
    }
  };
}

/** Counts one request and says whether it is one too many. */
export const spendRequest = makeRequestLimits(REQUEST_LIMITS);

/**
 * The limit as response fields (draft-ietf-httpapi-ratelimit-headers-10: a policy by name with quota and window, what
 * is left of it and for how long), and Retry-After (RFC 9110) once it is used up.
 */
export function limitHeaders(
  limit: RequestLimit,
  { ok, left, seconds }: SpentRequest
): Record<string, string> {
  const { quota, window } = REQUEST_LIMITS[limit];
  return {
    'ratelimit-policy': `"${limit}";q=${quota};w=${window}`,
    ratelimit: `"${limit}";r=${left};t=${seconds}`,
    ...(ok ? {} : { 'retry-after': String(seconds) })
  };
}
