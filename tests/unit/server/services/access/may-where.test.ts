import { eq } from 'drizzle-orm';
import { ACTIONS, type Action } from '$lib/server/access/actions';
import { can } from '$lib/server/access/can';
import { newId } from '$lib/server/db/new-id';
import { membership, originalFile, person, dataset } from '$lib/server/db/schema';
import { mayWhere } from '$lib/server/services/access/may-where';
import { ROLES } from '$lib/model/team/roles';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

function rowOf(teamId: string, fileId: string, createdBy: string | null) {
  const plain = { name: 'x', reading: '{}', counts: '{}', kind: 'histogram' as const, digest: 'd', shots: 1 };
  const rest = {
    mean: 0,
    largest: 0,
    geometry: 'sites' as const,
    unit: 'defect' as const,
    createdAt: 1,
    updatedAt: 1
  };
  return { id: newId(), teamId, fileId, createdBy, ...plain, ...rest };
}

function setting() {
  const db = freshDatabase();
  const [ours, theirs] = [makeTeam(db), makeTeam(db)];
  const file = (teamId: string) => {
    const id = newId();
    db.insert(originalFile)
      .values({ id, teamId, name: 'f', sha256: id, size: 0, bytes: Buffer.of(), createdAt: 1 })
      .run();
    return id;
  };
  return { db, ours, theirs, ourFile: file(ours.id), theirFile: file(theirs.id) };
}

describe('mayWhere', () => {
  it('finds just the rows that can() allows, for every role and action', () => {
    const { db, ours, theirs, ourFile, theirFile } = setting();
    for (const role of ROLES) {
      const actor = makeMember(db, ours.id, role);
      const other = makeMember(db, ours.id, 'experimenter');
      const rows = [
        rowOf(ours.id, ourFile, actor.personId),
        rowOf(ours.id, ourFile, other.personId),
        rowOf(theirs.id, theirFile, actor.personId)
      ];
      db.delete(dataset).run();
      db.insert(dataset).values(rows).run();
      for (const action of Object.keys(ACTIONS) as Action[]) {
        const found = db
          .select({ id: dataset.id })
          .from(dataset)
          .where(mayWhere(actor, action, dataset.teamId, dataset.createdBy))
          .all()
          .map(({ id }) => id);
        const standing = { kind: 'member' as const, personId: actor.personId, role };
        const allowed = rows
          .slice(0, 2)
          .filter((row) => can(standing, action, row))
          .map(({ id }) => id);
        expect(found.sort(), `${role} ${action}`).toEqual(allowed.sort());
      }
    }
  });

  it('finds nothing once the membership has ended, or the person was disabled', () => {
    const { db, ours, ourFile } = setting();
    const [gone, off] = [makeMember(db, ours.id, 'lead'), makeMember(db, ours.id, 'lead')];
    db.insert(dataset)
      .values(rowOf(ours.id, ourFile, null))
      .run();
    const count = (actor: typeof gone) =>
      db
        .select()
        .from(dataset)
        .where(mayWhere(actor, 'see', dataset.teamId))
        .all().length;
    expect([count(gone), count(off)]).toEqual([1, 1]);
    db.delete(membership).where(eq(membership.personId, gone.personId)).run();
    db.update(person).set({ disabledAt: 1 }).where(eq(person.id, off.personId)).run();
    expect([count(gone), count(off)]).toEqual([0, 0]);
  });
});
