import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';

/**
 * How often, in how many seconds. Common practice, no source: a person mistypes a password a few times, a laboratory
 * shares one address. The counts live in memory: a restart forgets them, and nobody can make a restart.
 *
 * Ten wrong passwords close an account's password for a quarter of an hour, for its owner too; the mailed link, counted
 * by itself, stays open to them.
 */
const LIMITS = {
  password: { client: [40, 15 * 60], account: [10, 15 * 60] },
  mail: { client: [30, 60 * 60], account: [5, 60 * 60] }
} as const;

export type Limited = keyof typeof LIMITS;

/** Who tries: where from, and for which mail address, whether or not anybody has it. */
export interface Attempt {
  client: string;
  account: string;
}

const limiters = Object.fromEntries(
  Object.entries(LIMITS).map(([name, { client, account }]) => [
    name,
    { client: limiter(`${name}-client`, client), account: limiter(`${name}-account`, account) }
  ])
) as Record<Limited, Record<keyof Attempt, RateLimiterMemory>>;

function limiter(keyPrefix: string, [points, duration]: readonly [number, number]): RateLimiterMemory {
  return new RateLimiterMemory({ keyPrefix, points, duration });
}

export type SpendAttempt = { ok: true } | { ok: false; reason: 'wait'; seconds: number };

/** Counts an attempt before it is made, so that a hundred at once are a hundred, and says when it is one too many. */
export async function spendAttempt(what: Limited, attempt: Attempt): Promise<SpendAttempt> {
  for (const by of ['client', 'account'] as const) {
    try {
      await limiters[what][by].consume(attempt[by]);
    } catch (refused) {
      if (!(refused instanceof RateLimiterRes)) throw refused;
      return { ok: false, reason: 'wait', seconds: Math.max(1, Math.ceil(refused.msBeforeNext / 1000)) };
    }
  }
  return { ok: true };
}

/** An attempt that was right counts for nothing, and ends the row of wrong ones. */
export async function forgiveAttempt(what: Limited, { client, account }: Attempt): Promise<void> {
  await limiters[what].client.reward(client);
  await limiters[what].account.delete(account);
}
