import { eq } from 'drizzle-orm';
import { newId } from '$lib/server/db/new-id';
import { link, person } from '$lib/server/db/schema';
import { eventFilters } from '$lib/server/services/events/event-filters';
import { listEvents } from '$lib/server/services/events/list-events';
import { recordEvent } from '$lib/server/services/events/record-event';
import { changeRole } from '$lib/server/services/teams/change-role';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makePerson, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

function setting() {
  const db = freshDatabase();
  const [team, other] = [makeTeam(db), makeTeam(db)];
  const lead = makeMember(db, team.id, 'lead');
  const experimenter = makeMember(db, team.id, 'experimenter');
  db.update(person).set({ name: 'Bo Invented' }).where(eq(person.id, experimenter.personId)).run();
  return { db, team, lead, experimenter, stranger: makeMember(db, other.id, 'lead') };
}

describe('listEvents', () => {
  it('tells in words, newest first, with the names of now', async () => {
    const { db, team, lead, experimenter } = setting();
    const datasetId = makeDataset(db, team.id, experimenter.personId);
    recordEvent(
      db,
      { action: 'dataset.upload', teamId: team.id, personId: experimenter.personId, thing: datasetId },
      5
    );
    await makeReport(db, { teamId: team.id, datasetId, createdBy: null }, {}, 6);
    changeRole(db, lead, experimenter.personId, 'observer', 7);
    expect(listEvents(db, lead)).toEqual({
      events: [
        {
          id: 3,
          at: 7,
          action: 'member.role',
          words: 'Ada Invented made Bo Invented an observer, who was an experimenter before'
        },
        { id: 2, at: 6, action: 'report.make', words: 'The program made report 1 of “Invented chain”' },
        { id: 1, at: 5, action: 'dataset.upload', words: 'Bo Invented saved “Invented chain”' }
      ],
      next: null
    });
  });

  it('pages by the event, so that what happens meanwhile moves nothing', () => {
    const { db, team, lead } = setting();
    const tell = () => recordEvent(db, { action: 'team.make', teamId: team.id, personId: lead.personId }, 1);
    for (let i = 0; i < 5; i++) tell();
    const first = listEvents(db, lead, {}, 2);
    tell();
    const second = listEvents(db, lead, { before: first.next ?? 0 }, 2);
    const third = listEvents(db, lead, { before: second.next ?? 0 }, 2);
    expect([first, second, third].map(({ events }) => events.map(({ id }) => id))).toEqual([
      [5, 4],
      [3, 2],
      [1]
    ]);
    expect(third.next).toBeNull();
  });

  it('filters by action and person, and offers those that occur', () => {
    const { db, team, lead, experimenter } = setting();
    recordEvent(db, { action: 'team.make', teamId: team.id, personId: lead.personId });
    recordEvent(db, { action: 'dataset.upload', teamId: team.id, personId: experimenter.personId });
    recordEvent(db, { action: 'dataset.upload', teamId: team.id, personId: lead.personId });
    const ids = (filter: Parameters<typeof listEvents>[2]) =>
      listEvents(db, lead, filter).events.map(({ id }) => id);
    expect(ids({ action: 'dataset.upload' })).toEqual([3, 2]);
    expect(ids({ personId: lead.personId })).toEqual([3, 1]);
    expect(ids({ action: 'dataset.upload', personId: lead.personId })).toEqual([3]);
    expect(eventFilters(db, lead)).toEqual({
      actions: ['dataset.upload', 'team.make'],
      people: [
        { id: lead.personId, name: 'Ada Invented' },
        { id: experimenter.personId, name: 'Bo Invented' }
      ]
    });
  });

  it('never names who came by a link that hides its referees, in words or by filter', async () => {
    const { db, team, lead } = setting();
    const referee = makePerson(db, 'Rea Feree');
    const datasetId = makeDataset(db, team.id);
    const { id: reportId } = await makeReport(db, { teamId: team.id, datasetId });
    const plain = {
      teamId: team.id,
      reportId,
      label: 'round 2',
      audience: 'named',
      shows: 'report'
    } as const;
    const ids = { hiding: newId(), open: newId() };
    for (const [key, hidesReferees] of [
      ['hiding', true],
      ['open', false]
    ] as const)
      db.insert(link)
        .values({
          ...plain,
          id: ids[key],
          tokenHash: key,
          blind: true,
          hidesReferees,
          allowsRemarks: true,
          createdAt: 1
        })
        .run();
    const said = { action: 'remark.add', teamId: team.id, personId: referee.id, thing: reportId };
    recordEvent(db, { ...said, linkId: ids.hiding });
    expect(eventFilters(db, lead).people).toEqual([]);
    expect(listEvents(db, lead, { personId: referee.id }).events).toEqual([]);
    expect(listEvents(db, lead).events[0].words).toBe('A referee remarked on report 1 of “Invented chain”');
    recordEvent(db, { ...said, linkId: ids.open });
    expect(listEvents(db, lead).events[0].words).toMatch(/^Rea Feree remarked/);
    // Members who make and revoke such links are named all the same.
    const revoked = { action: 'link.revoke', teamId: team.id, personId: lead.personId };
    recordEvent(db, { ...revoked, linkId: ids.hiding, thing: reportId });
    expect(listEvents(db, lead, { personId: lead.personId }).events[0].words).toBe(
      'Ada Invented closed the link “round 2” to report 1 of “Invented chain”'
    );
    // A link that is gone cannot say any more whether it hid them.
    db.delete(link).run();
    expect(JSON.stringify([listEvents(db, lead), eventFilters(db, lead)])).not.toMatch(/Rea Feree/);
  });

  it('is for leads of the team alone, and names nothing of another team', () => {
    const { db, team, lead, experimenter, stranger } = setting();
    const foreign = makeDataset(db, stranger.teamId, null, { name: 'Theirs' });
    recordEvent(db, { action: 'dataset.edit', teamId: team.id, personId: lead.personId, thing: foreign });
    for (const actor of [experimenter, stranger, { ...stranger, teamId: team.id }]) {
      expect(listEvents(db, actor)).toEqual({ events: [], next: null });
      expect(eventFilters(db, actor)).toEqual({ actions: [], people: [] });
    }
    expect(listEvents(db, lead).events[0].words).toBe('Ada Invented changed the conditions of a dataset');
  });
});
