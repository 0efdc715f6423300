import { link, membership, person, remark, report } from '$lib/server/db/schema';
import { addRemark } from '$lib/server/services/remarks/add-remark';
import { remarksOf } from '$lib/server/services/remarks/remarks-of';
import { settleThread } from '$lib/server/services/remarks/settle-thread';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { given, remarkSetting } from '../../../../support/remark-setting';

describe('remarksOf, for the team', () => {
  it('gives threads in order, with what is one’s own and who settled', async () => {
    const { db, maker, observer, member, say, reportId } = await remarkSetting();
    const first = given(addRemark(db, member(observer), say('line one\nline two'), 5));
    given(addRemark(db, member(maker), say('answer', first.threadId), 6));
    given(addRemark(db, member(maker), say('second thread'), 7));
    settleThread(db, member(maker), { reportId, threadId: first.threadId, settled: true }, 8);
    settleThread(db, member(observer), { reportId, threadId: first.threadId, settled: true }, 9);
    const threads = remarksOf(db, { reportId, via: 'team', actor: maker });
    expect(
      threads.map(({ section, settled, link, remarks }) => [section, settled, link, remarks.length])
    ).toEqual([
      ['law', { at: 8, by: 'Ada Invented' }, null, 2],
      ['law', null, null, 1]
    ]);
    expect(threads[0].remarks).toMatchObject([
      { body: 'line one\nline two', by: 'Ada Invented', from: 'team', mine: false, createdAt: 5 },
      { body: 'answer', mine: true }
    ]);
  });

  it('gives nothing to another team, to one who left, or of a report put aside', async () => {
    const { db, team, maker, observer, stranger, member, say, reportId } = await remarkSetting();
    given(addRemark(db, member(maker), say('x')));
    const seen = (actor: typeof maker) => remarksOf(db, { reportId, via: 'team', actor }).length;
    expect([seen(observer), seen(stranger), seen({ ...stranger, teamId: team.id })]).toEqual([1, 0, 0]);
    db.delete(membership).where(eq(membership.personId, observer.personId)).run();
    expect(seen(observer)).toBe(0);
    db.update(report).set({ deletedAt: 1 }).where(eq(report.id, reportId)).run();
    expect(seen(maker)).toBe(0);
  });

  it('shows which link a thread came by, and no name where the link hides referees', async () => {
    const { db, maker, makeLink, makePerson, referee, say, reportId } = await remarkSetting();
    const ruth = makePerson('Ruth Referee');
    const hiding = makeLink({ label: 'round 2', hidesReferees: true, blind: true });
    const { threadId } = given(addRemark(db, referee(hiding, 'Ruth Referee', ruth.id), say('x')));
    settleThread(db, referee(hiding, '', ruth.id), { reportId, threadId, settled: true }, 9);
    given(addRemark(db, referee(makeLink(), 'Rolf Referee'), say('y')));
    const threads = remarksOf(db, { reportId, via: 'team', actor: maker });
    expect(threads[0]).toMatchObject({
      link: { label: 'round 2', blind: true, hidesReferees: true },
      settled: { at: 0, by: 'A referee' },
      remarks: [{ by: 'A referee', from: 'link', mine: false }]
    });
    expect(threads[1].remarks[0].by).toBe('Rolf Referee');
    // Not even when the row of the link is gone, or the link is made to tell.
    db.update(link).set({ hidesReferees: false }).where(eq(link.id, hiding)).run();
    expect(JSON.stringify(remarksOf(db, { reportId, via: 'team', actor: maker }))).not.toContain('Ruth');
    db.delete(link).where(eq(link.id, hiding)).run();
    expect(JSON.stringify(remarksOf(db, { reportId, via: 'team', actor: maker }))).not.toContain('Ruth');
  });

  it('tells of hidden referees the day alone, and of others when it was', async () => {
    const { db, maker, makeLink, member, referee, say, reportId } = await remarkSetting();
    const day = 86_400_000;
    const hiding = makeLink({ hidesReferees: true });
    const { threadId } = given(addRemark(db, referee(hiding), say('x'), 3 * day + 5678));
    given(addRemark(db, member(maker), say('y', threadId), 3 * day + 6000));
    settleThread(db, referee(hiding), { reportId, threadId, settled: true }, 4 * day + 17);
    given(addRemark(db, referee(makeLink()), say('z'), 5 * day + 23));
    const team = remarksOf(db, { reportId, via: 'team', actor: maker });
    expect(team.map(({ remarks }) => remarks.map(({ createdAt }) => createdAt))).toEqual([
      [3 * day, 3 * day + 6000],
      [5 * day + 23]
    ]);
    expect(team[0].settled).toEqual({ at: 4 * day, by: 'A referee' });
    const own = remarksOf(db, { reportId, via: { linkId: hiding } });
    expect(own[0].remarks[0].createdAt).toBe(3 * day + 5678);
  });

  it('says which names were typed by nobody known', async () => {
    const { db, maker, makeLink, makePerson, member, referee, say, reportId } = await remarkSetting();
    const id = makeLink();
    given(addRemark(db, member(maker), say('ours')));
    given(addRemark(db, referee(id, 'Rolf'), say('typed')));
    given(addRemark(db, referee(id), say('unsigned')));
    given(addRemark(db, referee(id, 'Ruth', makePerson('Ruth').id), say('signed in')));
    const seen = remarksOf(db, { reportId, via: 'team', actor: maker }).map(({ remarks: [first] }) => first);
    expect(seen.map(({ from, typed }) => [from, typed])).toEqual([
      ['team', false],
      ['link', true],
      ['link', false],
      ['link', false]
    ]);
  });

  it('keeps the signature of somebody who is gone', async () => {
    const { db, maker, observer, member, say, reportId } = await remarkSetting();
    const { threadId } = given(addRemark(db, member(observer), say('x')));
    settleThread(db, member(observer), { reportId, threadId, settled: true }, 9);
    db.delete(person).where(eq(person.id, observer.personId)).run();
    expect(remarksOf(db, { reportId, via: 'team', actor: maker })).toMatchObject([
      { settled: { by: 'Somebody who has left' }, remarks: [{ by: 'Ada Invented' }] }
    ]);
  });
});

describe('remarksOf, by a link', () => {
  it('gives the threads of that link with the team’s answers, and nothing else', async () => {
    const { db, maker, makeLink, makePerson, member, referee, say, reportId } = await remarkSetting();
    const [one, two] = [makeLink(), makeLink()];
    const ruth = makePerson('Ruth Referee');
    given(addRemark(db, member(maker), say('among ourselves')));
    given(addRemark(db, referee(two), say('of another referee')));
    const mine = given(addRemark(db, referee(one, 'Ruth Referee', ruth.id), say('objection')));
    given(addRemark(db, member(maker), say('reply', mine.threadId)));
    const seen = remarksOf(db, { reportId, via: { linkId: one }, viewer: ruth.id });
    expect(seen).toMatchObject([
      {
        link: null,
        remarks: [
          { body: 'objection', by: 'Ruth Referee', from: 'link', mine: true },
          { body: 'reply', by: 'Ada Invented', from: 'team', mine: false }
        ]
      }
    ]);
  });

  it('hides the team’s names from readers of a blind link, the settler’s too', async () => {
    const { db, maker, makeLink, member, referee, say, reportId } = await remarkSetting();
    const blind = makeLink({ blind: true });
    const { threadId } = given(addRemark(db, referee(blind), say('objection')));
    given(addRemark(db, member(maker), say('reply', threadId)));
    settleThread(db, member(maker), { reportId, threadId, settled: true }, 9);
    const seen = remarksOf(db, { reportId, via: { linkId: blind } });
    expect(seen).toMatchObject([
      { settled: { by: 'The team' }, remarks: [{ by: 'A referee' }, { by: 'The team' }] }
    ]);
    // A former member is no less hidden.
    db.delete(membership).where(eq(membership.personId, maker.personId)).run();
    expect(JSON.stringify(remarksOf(db, { reportId, via: { linkId: blind } }))).not.toContain('Ada');
  });

  it('gives nothing for a link to another report, or one that is not', async () => {
    const { db, makeLink, referee, say, reportId } = await remarkSetting();
    const id = makeLink();
    given(addRemark(db, referee(id), say('x')));
    expect(remarksOf(db, { reportId: 'other', via: { linkId: id } })).toEqual([]);
    expect(remarksOf(db, { reportId, via: { linkId: 'none' } })).toEqual([]);
    expect(db.select().from(remark).all()).toHaveLength(1);
  });
});
