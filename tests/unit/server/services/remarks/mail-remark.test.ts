import { link, membership, person } from '$lib/server/db/schema';
import { addRemark } from '$lib/server/services/remarks/add-remark';
import { mailRemark } from '$lib/server/services/remarks/mail-remark';
import { saveWatch } from '$lib/server/services/watches/save-watch';
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

  it('tells nobody whose watch on remarks tells them', async () => {
    const { db, team, maker, observer, member, say, mailed } = await setting();
    const first = given(addRemark(db, member(observer), say('x')));
    const watch = (about: ('remark' | 'gate-fail')[]) =>
      saveWatch(db, maker.personId, team.slug, { about, rhythm: 'daily' });
    watch(['gate-fail']);
    expect((await mailed(first.id)).sent).toHaveLength(1);
    watch(['remark']);
    expect((await mailed(first.id)).sent).toEqual([]);
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

  it('tells of a reader of a link that it is one, whatever the name', async () => {
    const { db, makeLink, makePerson, referee, say, mailed } = await setting();
    const id = makeLink({ label: 'round 2' });
    const first = given(addRemark(db, referee(id, 'Ruth', makePerson('Ruth').id), say('x'), 1));
    expect((await mailed(first.id)).sent[0].text).toContain(
      '“Ruth”, a reader of the link “round 2”, remarked on'
    );
    const second = given(addRemark(db, referee(id, 'Ada of Team'), say('y', first.threadId), 2));
    const { sent } = await mailed(second.id);
    expect(sent.map(({ text }) => text.split('\n')[0])).toEqual([
      '“Ada of Team”, a reader of the link like you, answered your remark on the best law of a report:'
    ]);
  });

  it('tells the maker of remarks by one link once an hour, and of the team’s own each time', async () => {
    const { db, maker, observer, makeLink, member, referee, say, emailOf, mailed } = await setting();
    const hour = 3_600_000;
    const [one, two] = [makeLink(), makeLink()];
    const tells = async (author: ReturnType<typeof member>, body: string, at: number) => {
      const { sent } = await mailed(given(addRemark(db, author, say(body), at)).id);
      return sent.some(({ to }) => to === emailOf(maker.personId));
    };
    expect(await tells(referee(one), 'a', 1000)).toBe(true);
    expect(await tells(referee(one), 'b', 1001)).toBe(false);
    expect(await tells(referee(two), 'c', 1002)).toBe(true);
    expect(await tells(member(observer), 'd', 1003)).toBe(true);
    // A steady stream is one mail an hour, not none.
    expect(await tells(referee(one), 'e', 1000 + hour - 1)).toBe(false);
    expect(await tells(referee(one), 'f', 1000 + hour)).toBe(true);
    expect(await tells(referee(one), 'g', 1001 + hour)).toBe(false);
  });

  it('tells the maker no oftener for having answered in the thread, and other authors of it once an hour', async () => {
    const { db, maker, observer, makeLink, member, referee, say, emailOf, mailed } = await setting();
    const id = makeLink();
    const told = async (author: ReturnType<typeof member>, body: string, at: number, thread?: string) => {
      const made = given(addRemark(db, author, say(body, thread), at));
      return { ...made, to: (await mailed(made.id)).sent.map(({ to }) => to) };
    };
    const { threadId } = await told(referee(id), 'a', 1);
    await told(member(maker), 'b', 2, threadId);
    await told(member(observer), 'c', 3, threadId);
    expect((await told(referee(id), 'd', 4, threadId)).to).toEqual([emailOf(observer.personId)]);
    expect((await told(referee(id), 'd again', 5, threadId)).to).toEqual([]);
    expect((await told(referee(id), 'e', 3_600_004, threadId)).to).toEqual(
      [maker, observer].map(({ personId }) => emailOf(personId))
    );
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
