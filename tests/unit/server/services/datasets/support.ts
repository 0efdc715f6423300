import type { Role } from '$lib/model/team/roles';
import type { SaveRequest } from '$lib/model/team/datasets/save-request';
import type { Database } from '$lib/server/db/client';
import type { Actor } from '$lib/server/services/access/actor';
import { previewFile } from '$lib/server/services/datasets/preview-file';
import { storeFile } from '$lib/server/services/datasets/store-file';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

/** A team with one person of each role, and the lead of another team. */
export function setting() {
  const db = freshDatabase();
  const [ours, theirs] = [makeTeam(db), makeTeam(db)];
  const of = (role: Role) => makeMember(db, ours.id, role);
  return {
    db,
    lead: of('lead'),
    experimenter: of('experimenter'),
    observer: of('observer'),
    stranger: makeMember(db, theirs.id, 'lead')
  };
}

/** Stores a text as a file and gives its id. */
export function store(db: Database, actor: Actor, text: string, name = 'made.csv'): string {
  const stored = storeFile(db, actor, { name, bytes: new TextEncoder().encode(text) });
  if (!stored.ok) throw new Error(stored.reason);
  return stored.file.id;
}

/** The request that saves every dataset of a file as its preview shows it. */
export function wholeFile(db: Database, actor: Actor, fileId: string, again = false): SaveRequest {
  const read = previewFile(db, actor, fileId, {});
  if (!read.ok) throw new Error(read.reason);
  const datasets = read.preview.datasets.map(({ index, conditions }) => ({ index, conditions }));
  return { files: [{ fileId, choices: {}, again, datasets }] };
}

/** Invented: a long table of two devices under two firmware versions. */
export const LONG_TABLE = [
  'device,firmware,quench_time_us,date,note,count,shots',
  ...['Kelp', 'Marram'].flatMap((device, i) =>
    ['ebb 3.1', 'ebb 3.2'].flatMap((firmware, j) =>
      [0, 1, 2].map(
        (n) => `${device},${firmware},${2.5 * (i + 1)},2026-03-1${j},invented,${n},${90 - 30 * n + i + 2 * j}`
      )
    )
  )
].join('\n');
