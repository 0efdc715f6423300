import { event, watch, webhook } from '$lib/server/db/schema';
import { newerEvents } from '$lib/server/services/events/newer-events';
import { gatherDeliveries } from '$lib/server/services/webhooks/gather-deliveries';
import { peopleToTell } from '$lib/server/services/watches/claim-news';
import { saveWatch } from '$lib/server/services/watches/save-watch';
import { sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { madeWebhook } from '../../../../support/webhooks';

const db = freshDatabase();

describe('events after one', () => {
  it.each([
    [
      'a webhook',
      sql`select ${event.id} from ${webhook} join ${event} on ${newerEvents(webhook.teamId, webhook.lastEvent)} where ${webhook.id} = 'x' order by ${event.id}`
    ],
    [
      'a watch',
      sql`select 1 from ${watch} where exists (select 1 from ${event} where ${newerEvents(watch.teamId, watch.lastEvent)})`
    ],
    ['a number', sql`select ${event.id} from ${event} where ${newerEvents('a', 7)}`]
  ])('of %s are looked up by their number, not through all of the team', (_name, query) => {
    const plan = db.all<{ detail: string }>(sql`explain query plan ${query}`).map(({ detail }) => detail);
    expect(plan.join('\n')).toMatch(/SEARCH event (EXISTS )?USING INTEGER PRIMARY KEY \(rowid>\?\)/);
  });

  it('are told of as soon as there is one, and the many before are not', () => {
    const { id } = makeTeam(db, 'bay-side');
    const ada = makeMember(db, id, 'lead');
    const add = db.$client.prepare(`insert into event (at, team_id, action) values (?, ?, 'gate.fail')`);
    db.$client.transaction(() => {
      for (let k = 0; k < 50_000; k++) add.run(k, id);
    })();
    madeWebhook(db, ada, 'https://example.org/', 1);
    saveWatch(db, ada.personId, 'bay-side', { about: ['gate-fail'], rhythm: 'at-once' });
    expect(gatherDeliveries(db)).toBe(0);
    expect(peopleToTell(db, 7, Date.now())).toEqual([]);
    add.run(1, id);
    expect(gatherDeliveries(db)).toBe(1);
    expect(peopleToTell(db, 7, Date.now())).toEqual([ada.personId]);
  });
});
