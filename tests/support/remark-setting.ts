import { newId } from '$lib/server/db/new-id';
import { link } from '$lib/server/db/schema';
import type { RemarkAuthor } from '$lib/server/services/remarks/remark-author';
import { freshDatabase } from './fresh-database';
import { makeMember, makePerson, makeTeam } from './people';
import { makeDataset, makeReport } from './saved-reports';

/** A report with its maker and an observer, a stranger of another team, and ways to remark on it. */
export async function remarkSetting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  const maker = makeMember(db, team.id, 'experimenter');
  const observer = makeMember(db, team.id, 'observer');
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const datasetId = makeDataset(db, team.id, null, { name: 'Slow quench' });
  const { id: reportId } = await makeReport(db, { teamId: team.id, datasetId, createdBy: maker.personId });

  const makeLink = (more: Partial<typeof link.$inferInsert> = {}): string => {
    const id = newId();
    db.insert(link)
      .values({
        id,
        teamId: team.id,
        reportId,
        tokenHash: id,
        label: 'referee 2',
        audience: 'anyone',
        shows: 'report',
        blind: false,
        hidesReferees: false,
        allowsRemarks: true,
        createdAt: 1,
        ...more
      })
      .run();
    return id;
  };
  const member = (actor: typeof maker): RemarkAuthor => ({ kind: 'member', actor });
  const referee = (linkId: string, signedAs = '', personId: string | null = null): RemarkAuthor => ({
    kind: 'referee',
    linkId,
    personId,
    signedAs
  });
  const say = (body: string, threadId: string | null = null) => ({
    reportId,
    section: 'law' as const,
    threadId,
    body
  });
  return {
    db,
    team,
    maker,
    observer,
    stranger,
    datasetId,
    reportId,
    makeLink,
    makePerson: (name: string) => makePerson(db, name),
    member,
    referee,
    say
  };
}

/** What a service that answers `{ ok, … }` gave, when it went well. */
export function given<T extends { ok: boolean }>(answer: T): Extract<T, { ok: true }> {
  if (!answer.ok) throw new Error(JSON.stringify(answer));
  return answer as Extract<T, { ok: true }>;
}
