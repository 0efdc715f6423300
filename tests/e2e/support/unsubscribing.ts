import type { Database } from '$lib/server/db/client';
import { team } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { saveWatch } from '$lib/server/services/watches/save-watch';
import { unsubscribeToken } from '$lib/server/services/watches/unsubscribe-token';
import { eq } from 'drizzle-orm';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';

/** Somebody who watches a team, and the address that ends the mail, as a running server would write it. */
export function unsubscribing(
  db: Database,
  server: { data: string },
  { personId, teamId }: Pick<Actor, 'personId' | 'teamId'>
): string[] {
  const { slug } = db.select({ slug: team.slug }).from(team).where(eq(team.id, teamId)).get()!;
  saveWatch(db, personId, slug, { about: ['gate-fail', 'remark'], rhythm: 'daily' });
  const secret = readFileSync(join(server.data, 'auth-secret'), 'utf8');
  return [`/unsubscribe/${unsubscribeToken({ personId, teamId }, secret)}`];
}
