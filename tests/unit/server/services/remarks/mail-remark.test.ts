import { link, membership, person } from '$lib/server/db/schema';
import { addRemark } from '$lib/server/services/remarks/add-remark';
import { mailRemark } from '$lib/server/services/remarks/mail-remark';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { given, remarkSetting } from '../../../../support/remark-setting';

const ADDRESS = 'https://counts.example/team/x/reports/y';

async function setting() {
  const base = await remarkSetting();
  const { db } = base;
  const emailOf = (id: string) => db.select().from(person).where(eq(person.id, id)).get()!.email;
  const mailed = async (remarkId: string, ok = true) => {
    const sent: { to: string; subject: string; text: string }[] = [];
    const missed = await mailRemark(db, remarkId, ADDRESS, async (_db, message) => {
      sent.push(message);
      return ok ? { ok: true } : { ok: false, reason: 'not-sent' };
    });
    return { sent, missed };
  };
  return { ...base, emailOf, mailed };
}

describe('mailRemark', () => {
  it('tells the maker and the earlier authors of the thread, each once, never the author', async () => {
    const { db, maker, observer, member, say, emailOf, mailed } = await setting();
    const first = given(addRemark(db, member(observer), say('Why?\nReally?')));
    const { sent } = await mailed(first.id);
    expect(sent.map(({ to }) => to)).toEqual([emailOf(maker.personId)]);
    expect(sent[0].subject).toBe('New remark on report 1 of Slow quench');
    expect(sent[0].text).toContain('Ada Invented remarked on the best law');
    expect(sent[0].text).toContain('> Why?\n> Really?');
    expect(sent[0].text).toContain(`${ADDRESS}#remarks-law`);
    const answer = given(addRemark(db, member(maker), say('So.', first.threadId)));
    expect((await mailed(answer.id)).sent.map(({ to }) => to)).toEqual([emailOf(observer.personId)]);
    const third = given(addRemark(db, member(observer), say('I see.', first.threadId)));
    expect((await mailed(third.id)).sent.map(({ to }) => to)).toEqual([emailOf(maker.personId)]);
  });

  it('tells nobody who left, nobody disabled, and says how many messages did not go', async () => {
    const { db, maker, observer, member, say, mailed } = await setting();
    const first = given(addRemark(db, member(observer), say('x')));
    expect(await mailed(first.id, false)).toMatchObject({ missed: 1 });
    db.update(person).set({ disabledAt: 1 }).where(eq(person.id, maker.personId)).run();
    expect((await mailed(first.id)).sent).toEqual([]);
    db.update(person).set({ disabledAt: null }).where(eq(person.id, maker.personId)).run();
    db.delete(membership).where(eq(membership.personId, maker.personId)).run();
    expect((await mailed(first.id)).sent).toEqual([]);
  });

  it('tells a referee of an answer without naming team, report or dataset of a blind link', async () => {
    const { db, team, maker, makeLink, makePerson, member, referee, say, mailed } = await setting();
    const ruth = makePerson('Ruth Referee');
    const id = makeLink({ blind: true, hidesReferees: true, audience: 'named' });
    const first = given(addRemark(db, referee(id, '', ruth.id), say('objection')));
    const toTeam = (await mailed(first.id)).sent;
    expect(toTeam).toHaveLength(1);
    expect(JSON.stringify(toTeam)).not.toMatch(/Ruth/);
    const answer = given(addRemark(db, member(maker), say('reply', first.threadId)));
    const { sent } = await mailed(answer.id);
    expect(sent.map(({ to }) => to)).toEqual([ruth.email]);
    const letter = JSON.stringify(sent);
    for (const secret of [team.name, team.slug, 'Slow quench', 'Ada', ADDRESS])
      expect(letter).not.toContain(secret);
    expect(sent[0].text).toContain('The team answered your remark');
    // Once the link is closed, its readers hear no more.
    db.update(link).set({ revokedAt: 1 }).where(eq(link.id, id)).run();
    expect((await mailed(answer.id)).sent).toEqual([]);
  });

  it('names the team to the referee of an open link', async () => {
    const { db, team, maker, makeLink, makePerson, member, referee, say, mailed } = await setting();
    const ruth = makePerson('Ruth Referee');
    const first = given(addRemark(db, referee(makeLink(), 'Ruth', ruth.id), say('objection')));
    const answer = given(addRemark(db, member(maker), say('reply', first.threadId)));
    expect((await mailed(answer.id)).sent[0].text).toContain(
      `Ada Invented of ${team.name} answered your remark`
    );
  });
});
