import { link, membership, person, watch } from '$lib/server/db/schema';
import { recordEvent } from '$lib/server/services/events/record-event';
import { removeMember } from '$lib/server/services/teams/remove-member';
import { tellWatchers } from '$lib/server/services/watches/tell-watchers';
import { and, eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { makeTeam } from '../../../../support/people';
import { DAY, NOW, SETTINGS, watchSetting } from './setting';

describe('nobody is told', () => {
  it('of their own deeds, but of the end of a diagnosis they asked for', async () => {
    const { db, teamId, ada, sent, watches, gate, tell } = watchSetting();
    watches({ about: ['gate-fail', 'remark', 'job-end'] });
    gate('own', { personId: ada.personId });
    const own = { teamId, personId: ada.personId, thing: 'r' };
    recordEvent(db, { ...own, action: 'remark.add' }, NOW);
    await tell();
    expect(sent).toEqual([]);
    recordEvent(db, { ...own, action: 'report.make' }, NOW);
    await tell();
    expect(sent[0].subject).toBe('A report was made (Team bay-side)');
  });

  it('who left, not even after coming back; nor who is disabled', async () => {
    const { db, teamId, ada, ben, sent, watches, gate, tell } = watchSetting();
    watches({ rhythm: 'daily' }, ben);
    watches();
    gate('while in');
    removeMember(db, ada, ben.personId, NOW);
    gate('while out');
    db.insert(membership).values({ teamId, personId: ben.personId, role: 'observer', createdAt: NOW }).run();
    db.update(person).set({ disabledAt: NOW }).where(eq(person.id, ada.personId)).run();
    await tell();
    await tell(NOW + 2 * DAY);
    expect(sent).toEqual([]);
    db.update(person).set({ disabledAt: null }).where(eq(person.id, ada.personId)).run();
    await tell(NOW + 3 * DAY);
    expect(sent).toEqual([]);
    // Taken out behind the service's back: the watch ends at the next look.
    const mine = and(eq(membership.personId, ada.personId), eq(membership.teamId, teamId));
    db.delete(membership).where(mine).run();
    gate('later');
    await tell(NOW + 4 * DAY);
    expect([sent, db.select().from(watch).all()]).toEqual([[], []]);
    expect(watches().ok).toBe(false);
  });

  it('of another team’s doings', async () => {
    const { db, sent, watches, gate, tell } = watchSetting();
    const other = makeTeam(db, 'lagoon').id;
    watches();
    gate('strange', { teamId: other });
    await tell();
    expect(sent).toEqual([]);
  });
});

describe('mail that does not go', () => {
  it('is tried again later and comes once', async () => {
    const { sent, mail, watches, gate, tell } = watchSetting();
    watches();
    gate('first');
    mail.refuses = { ok: false, reason: 'not-sent' };
    await tell();
    mail.refuses = null;
    await tell(NOW + 1000);
    expect(sent).toEqual([]);
    await tell(NOW + 6 * 60_000);
    await tell(NOW + DAY);
    expect(sent).toHaveLength(1);
  });

  it('for want of a mail server does not pile up', async () => {
    const { sent, mail, watches, gate, tell } = watchSetting();
    watches();
    gate('first');
    mail.refuses = { ok: false, reason: 'no-mail-server' };
    await tell();
    mail.refuses = null;
    await tell(NOW + DAY);
    expect(sent).toEqual([]);
  });

  it('is not told by a second process meanwhile', async () => {
    const { db, sent, watches, gate, tell } = watchSetting();
    watches();
    gate('first');
    let second = -1;
    await tellWatchers(
      db,
      SETTINGS,
      new Map(),
      async () => {
        second = await tell();
        return { ok: true };
      },
      NOW
    );
    expect([second, sent]).toEqual([0, []]);
  });
});

it('names no referee whom a link hides', async () => {
  const { db, teamId, ada, ben, sent, watches, tell } = watchSetting();
  watches({ about: ['remark'] });
  const made = { teamId, createdBy: ada.personId, createdAt: 1 };
  const says = { label: 'blind', audience: 'anyone', shows: 'report', tokenHash: 'x' } as const;
  const hides = { blind: true, hidesReferees: true, allowsRemarks: true };
  db.$client.pragma('foreign_keys = off');
  db.insert(link)
    .values({ ...made, ...says, ...hides, id: 'l', reportId: 'r' })
    .run();
  recordEvent(db, { action: 'remark.add', teamId, linkId: 'l', thing: 'r', detail: { section: 'fit' } }, NOW);
  // A link that is gone is taken to have hidden its referees, and a person on the event would show.
  recordEvent(db, { action: 'remark.add', teamId, personId: ben.personId, linkId: 'gone', thing: 'r' }, NOW);
  await tell();
  expect(sent[0].text.match(/A referee remarked on/g)).toHaveLength(2);
  expect(sent[0].text).not.toMatch(/Ada Invented|fit/);
});

it('a thousand diagnoses are one mail, told by their number and the latest twenty', async () => {
  const { db, teamId, sent, watches, tell } = watchSetting();
  watches({ about: ['job-end'] });
  for (let k = 0; k < 1000; k++) recordEvent(db, { action: 'job.fail', teamId, thing: `${k}` }, NOW);
  await tell();
  expect(sent.map(({ subject }) => subject)).toEqual(['1000 things happened in Team bay-side']);
  expect(sent[0].text).toContain('980 more diagnoses that ended before these');
  expect(sent[0].text.match(/ failed:/g)).toHaveLength(20);
});
