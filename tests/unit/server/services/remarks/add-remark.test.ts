import { newId } from '$lib/server/db/new-id';
import { event, link, membership, remark, report, team } from '$lib/server/db/schema';
import { addRemark } from '$lib/server/services/remarks/add-remark';
import { settleThread } from '$lib/server/services/remarks/settle-thread';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../../../../support/saved-reports';
import { given, remarkSetting } from '../../../../support/remark-setting';

const unknown = { ok: false, reason: 'unknown' };

describe('addRemark', () => {
  it('begins a thread and answers it, signed and dated; the answer keeps the section', async () => {
    const { db, maker, observer, member, say, reportId } = await remarkSetting();
    const first = given(addRemark(db, member(observer), say('Why so few shots?'), 5));
    const answer = given(
      addRemark(db, member(maker), { ...say('The trap was lost.', first.threadId), section: 'tails' }, 6)
    );
    expect(first.threadId).toBe(first.id);
    expect(db.select().from(remark).where(eq(remark.id, answer.id)).get()).toMatchObject({
      reportId,
      section: 'law',
      threadId: first.id,
      personId: maker.personId,
      linkId: null,
      signedAs: 'Ada Invented',
      createdAt: 6
    });
    const told = db.select().from(event).where(eq(event.action, 'remark.add')).all();
    expect(told.map(({ personId, thing }) => [personId, thing])).toEqual([
      [observer.personId, reportId],
      [maker.personId, reportId]
    ]);
  });

  it('takes none from other teams, from one who left, on what was put aside, or in foreign threads', async () => {
    const { db, team, maker, observer, stranger, member, say, reportId } = await remarkSetting();
    expect(addRemark(db, member(stranger), say('x'))).toEqual(unknown);
    expect(addRemark(db, member({ ...stranger, teamId: team.id }), say('x'))).toEqual(unknown);
    expect(addRemark(db, member(maker), { ...say('x'), reportId: newId() })).toEqual(unknown);
    expect(addRemark(db, member(maker), say('x', newId()))).toEqual(unknown);
    // A thread of another report of the same team.
    const other = await makeReport(db, { teamId: team.id, datasetId: makeDataset(db, team.id) });
    const there = given(addRemark(db, member(maker), { ...say('x'), reportId: other.id }));
    expect(addRemark(db, member(maker), say('x', there.threadId))).toEqual(unknown);
    db.delete(membership).where(eq(membership.personId, observer.personId)).run();
    expect(addRemark(db, member(observer), say('x'))).toEqual(unknown);
    db.update(report).set({ deletedAt: 1 }).where(eq(report.id, reportId)).run();
    expect(addRemark(db, member(maker), say('x'))).toEqual(unknown);
    expect(db.select().from(remark).all()).toHaveLength(1);
  });

  it('takes the same words twice as one remark, sent twice', async () => {
    const { db, maker, observer, member, say } = await remarkSetting();
    const first = given(addRemark(db, member(maker), say('Once.'), 1000));
    expect(addRemark(db, member(maker), say('Once.'), 2000)).toEqual({ ...first, again: true });
    expect(given(addRemark(db, member(observer), say('Once.'), 2000)).again).toBe(false);
    expect(given(addRemark(db, member(maker), say('Once.'), 1000 + 120_000)).id).not.toBe(first.id);
    expect(given(addRemark(db, member(maker), say('Once.', first.id), 2000)).again).toBe(false);
  });

  it('is refused in a settled thread until that is opened again', async () => {
    const { db, maker, member, say, reportId } = await remarkSetting();
    const { threadId } = given(addRemark(db, member(maker), say('a'), 1));
    settleThread(db, member(maker), { reportId, threadId, settled: true }, 2);
    expect(addRemark(db, member(maker), say('b', threadId), 3)).toEqual({ ok: false, reason: 'settled' });
    settleThread(db, member(maker), { reportId, threadId, settled: false }, 4);
    expect(addRemark(db, member(maker), say('b', threadId), 5).ok).toBe(true);
  });
});

describe('addRemark by a link', () => {
  it('is signed as given, or as a referee', async () => {
    const { db, makeLink, referee, say } = await remarkSetting();
    const id = makeLink();
    given(addRemark(db, referee(id, 'R. Stranger'), say('one')));
    given(addRemark(db, referee(id, '  '), say('two')));
    expect(
      db
        .select()
        .from(remark)
        .all()
        .map(({ signedAs, linkId }) => [signedAs, linkId])
    ).toEqual([
      ['R. Stranger', id],
      ['A referee', id]
    ]);
  });

  it.each(['The team', 'the  TEÀM', 'The\u200b team', 'ada invented', '\u202eAda Invented', 'Team-name'])(
    'is not signed %j, which would be read as the team’s',
    async (name) => {
      const { db, team: ours, makeLink, referee, say } = await remarkSetting();
      db.update(team).set({ name: 'Team Name' }).where(eq(team.id, ours.id)).run();
      const id = makeLink();
      expect(addRemark(db, referee(id, name), say('x'))).toEqual({ ok: false, reason: 'name' });
      expect(db.select().from(remark).all()).toEqual([]);
    }
  );

  it('is not signed so by an account either, unless it is the member’s own', async () => {
    const { db, maker, makeLink, makePerson, referee, say, reportId } = await remarkSetting();
    const id = makeLink();
    const namesake = referee(id, 'Ada Invented', makePerson('Ada Invented').id);
    expect(addRemark(db, namesake, say('x'))).toEqual({ ok: false, reason: 'name' });
    const first = given(addRemark(db, referee(id, 'Ada Invented', maker.personId), say('x')));
    const settle = (author: typeof namesake) =>
      settleThread(db, author, { reportId, threadId: first.id, settled: true });
    expect(settle(namesake)).toEqual({ ok: false, reason: 'name' });
    expect(settle(referee(id)).ok).toBe(true);
  });

  it('gives away nobody of a blind link: names it never shows are refused no more than others', async () => {
    const { db, makeLink, referee, say } = await remarkSetting();
    const blind = makeLink({ blind: true });
    expect(addRemark(db, referee(blind, 'Ada Invented'), say('x')).ok).toBe(true);
    expect(addRemark(db, referee(blind, 'Bo Elsewhere'), say('x')).ok).toBe(true);
    expect(addRemark(db, referee(blind, 'the team'), say('x'))).toEqual({ ok: false, reason: 'name' });
  });

  it('is kept with a clean name, and events of a hidden referee tell the day alone', async () => {
    const { db, makeLink, referee, say } = await remarkSetting();
    const now = 86_400_000 * 3 + 5678;
    given(addRemark(db, referee(makeLink(), 'R.\u202e\n Stranger\u200b'), say('one'), now));
    given(addRemark(db, referee(makeLink({ hidesReferees: true })), say('two'), now));
    expect(db.select().from(remark).get()!.signedAs).toBe('R. Stranger');
    const told = db.select().from(event).where(eq(event.action, 'remark.add')).all();
    expect(told.map(({ at }) => at)).toEqual([now, 86_400_000 * 3]);
  });

  it('keeps no name and tells the events no person where the link hides referees', async () => {
    const { db, makeLink, makePerson, referee, say } = await remarkSetting();
    const ruth = makePerson('Ruth Referee');
    const id = makeLink({ hidesReferees: true });
    given(addRemark(db, referee(id, 'Ruth Referee', ruth.id), say('x')));
    expect(db.select().from(remark).get()!.signedAs).toBe('A referee');
    expect(db.select().from(event).where(eq(event.action, 'remark.add')).get()).toMatchObject({
      personId: null,
      linkId: id
    });
    expect(JSON.stringify(db.select().from(event).all())).not.toContain(ruth.id);
  });

  it('needs an open link to that report that allows remarks', async () => {
    const { db, team, makeLink, referee, say } = await remarkSetting();
    const other = await makeReport(db, { teamId: team.id, datasetId: makeDataset(db, team.id) });
    const answer = (more: Parameters<typeof makeLink>[0]) =>
      addRemark(db, referee(makeLink(more)), say('x'), 100);
    expect(answer({ allowsRemarks: false })).toEqual({ ok: false, reason: 'not-allowed' });
    expect(answer({ revokedAt: 50 })).toEqual(unknown);
    expect(answer({ expiresAt: 100 })).toEqual(unknown);
    expect(answer({ reportId: other.id })).toEqual(unknown);
    expect(addRemark(db, referee(newId()), say('x'), 100)).toEqual(unknown);
    expect(answer({ expiresAt: 101 }).ok).toBe(true);
  });

  it('answers and settles threads of that link alone', async () => {
    const { db, maker, makeLink, member, referee, say, reportId } = await remarkSetting();
    const [one, two] = [makeLink(), makeLink()];
    const ours = given(addRemark(db, member(maker), say('among us')));
    const mine = given(addRemark(db, referee(one), say('objection')));
    for (const threadId of [ours.threadId, mine.threadId]) {
      expect(addRemark(db, referee(two), say('x', threadId))).toEqual(unknown);
      expect(settleThread(db, referee(two), { reportId, threadId, settled: true })).toEqual(unknown);
    }
    expect(addRemark(db, referee(one), say('x', mine.threadId)).ok).toBe(true);
    expect(addRemark(db, member(maker), say('y', mine.threadId)).ok).toBe(true);
  });

  it('is full after 200 remarks through one link', async () => {
    const { db, makeLink, maker, member, referee, say } = await remarkSetting();
    const id = makeLink();
    for (let i = 0; i < 200; i++) given(addRemark(db, referee(id), say(`remark ${i}`)));
    expect(addRemark(db, referee(id), say('one more'))).toEqual({ ok: false, reason: 'full' });
    expect(addRemark(db, referee(makeLink()), say('one more')).ok).toBe(true);
    expect(addRemark(db, member(maker), say('one more')).ok).toBe(true);
    db.delete(link).where(eq(link.id, id)).run();
  });
});
