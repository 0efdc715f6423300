import { eq } from 'drizzle-orm';
import { newToken } from '$lib/server/auth/new-token';
import { newId } from '$lib/server/db/new-id';
import { dataset, link, person, remark } from '$lib/server/db/schema';
import { makeTrueDataset } from './archives';
import { freshDatabase } from './fresh-database';
import { makeMember, makePerson, makeTeam } from './people';
import { inventedCounts, makeReport } from './saved-reports';

/** A team with two kinds of counts, of one moment, a report with remarks and links, and things put aside. */
export async function fullTeam() {
  const db = freshDatabase();
  const team = makeTeam(db, 'ours');
  const lead = makeMember(db, team.id, 'lead');
  db.update(person).set({ passwordHash: 'SECRET-PASSWORD-HASH' }).where(eq(person.id, lead.personId)).run();
  const histogram = makeTrueDataset(db, lead, inventedCounts, {
    device: 'Heron "B", 2',
    quenchTime: 0.1,
    quenchUnit: 'µs',
    notes: 'first\nsecond line',
    reading: '{"separator":"comma","header":true}'
  });
  makeTrueDataset(
    db,
    lead,
    { kind: 'shots', shots: [2, 0, 1], batches: ['a', '=b', 'a,c'] },
    { name: 'Shots' }
  );
  makeTrueDataset(
    db,
    lead,
    {
      kind: 'histogram',
      counts: [
        [0, 30],
        [1, 50],
        [2, 20]
      ],
      lump: { from: 3, shots: 4 }
    },
    { name: 'Lump', part: 'x' }
  );
  makeTrueDataset(db, lead, inventedCounts, { name: 'Gone', deletedAt: 5 });
  const { id: reportId } = await makeReport(db, {
    teamId: team.id,
    datasetId: histogram,
    createdBy: lead.personId
  });
  await makeReport(db, { teamId: team.id, datasetId: histogram }, { seed: 5 });
  // Frozen earlier: these conditions are no longer those of the reports.
  db.update(dataset).set({ device: 'Heron C' }).where(eq(dataset.id, histogram)).run();
  const { token, hash } = newToken();
  const linkId = newId();
  const options = {
    audience: 'named',
    shows: 'report',
    blind: true,
    hidesReferees: true,
    allowsRemarks: true
  } as const;
  db.insert(link)
    .values({
      ...options,
      id: linkId,
      teamId: team.id,
      reportId,
      tokenHash: hash,
      label: 'referee 2',
      createdAt: 6
    })
    .run();
  const referee = makePerson(db, 'Rea Feree');
  const said = { reportId, section: 'answer', createdAt: 7 };
  const first = newId();
  db.insert(remark)
    .values([
      { ...said, id: first, body: 'Why 12 trials?', linkId, personId: referee.id, signedAs: 'Rea Feree' },
      {
        ...said,
        id: newId(),
        body: 'Twelve sites.',
        threadId: first,
        personId: lead.personId,
        signedAs: 'Ada'
      }
    ])
    .run();
  return { db, team, lead, hash, token, reportId };
}
