import { narrowerRole } from '$lib/model/team/narrower-role';
import type { TokenForm } from '$lib/model/api/token-form';
import { and, count, eq, gt, isNull } from 'drizzle-orm';
import { randomInt } from 'node:crypto';
import { hashToken, newToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { apiToken } from '../../db/schema';
import type { Actor } from '../access/actor';
import { recordEvent } from '../events/record-event';
import { roleNow } from './role-now';

/** Tokens that one team may have open at once: beyond it somebody makes one a run. */
export const MOST_TOKENS = 100;

export type MadeToken =
  | { ok: true; id: string; token: string }
  /** `above-you`: the role is wider than the maker's own. */
  | { ok: false; reason: 'not-allowed' | 'above-you' | 'too-many' };

const DAY = 86_400_000;
const LETTERS = 'abcdefghijkmnpqrstuvwxyz23456789';

/**
 * Makes a token for a script of the team: `sev_`, eight letters to recognise it by, `_`, and 256 random bits. It is in
 * the answer and nowhere else: the database keeps the sha256 of the whole.
 */
export function makeToken(db: Database, actor: Actor, form: TokenForm, now = Date.now()): MadeToken {
  return db.transaction(
    (tx): MadeToken => {
      const role = roleNow(tx, actor);
      if (role === null) return { ok: false, reason: 'not-allowed' };
      if (narrowerRole(role, form.role) !== form.role) return { ok: false, reason: 'above-you' };
      if (openTokens(tx, actor.teamId, now) >= MOST_TOKENS) return { ok: false, reason: 'too-many' };
      const hint = `sev_${Array.from({ length: 8 }, () => LETTERS[randomInt(LETTERS.length)]).join('')}`;
      const token = `${hint}_${newToken().token}`;
      const id = newId();
      const { name, scopes, days } = form;
      tx.insert(apiToken)
        .values({
          id,
          teamId: actor.teamId,
          name,
          tokenHash: hashToken(token),
          hint,
          role: form.role,
          scopes: JSON.stringify(scopes),
          createdBy: actor.personId,
          createdAt: now,
          expiresAt: now + days * DAY
        })
        .run();
      recordEvent(
        tx,
        {
          action: 'token.make',
          teamId: actor.teamId,
          personId: actor.personId,
          thing: id,
          detail: { name, role: form.role, scopes: scopes.join(', '), days }
        },
        now
      );
      return { ok: true, id, token };
    },
    { behavior: 'immediate' }
  );
}

function openTokens(db: Pick<Database, 'select'>, teamId: string, now: number): number {
  const open = and(eq(apiToken.teamId, teamId), isNull(apiToken.revokedAt), gt(apiToken.expiresAt, now));
  return db.select({ tokens: count() }).from(apiToken).where(open).get()?.tokens ?? 0;
}
