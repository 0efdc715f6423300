import type { ConditionProblems } from '../../../model/team/datasets/read-typed-conditions';
import type { NamedDataset } from '../../../model/team/datasets/preview';
import type { SaveRequest } from '../../../model/team/datasets/save-request';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { nameDevice } from '../devices/name-device';
import { recordEvent } from '../events/record-event';
import { mayInTeam } from './may-in-team';
import { partsToSave, type PartToSave } from './parts-to-save';
import { savedBefore } from './saved-before';

/** Where in the request something is wrong. */
export interface SaveTrouble {
  fileId: string;
  index: number;
  problems: ConditionProblems;
}

export type SavedDatasets =
  | { ok: true; saved: NamedDataset[] }
  /** `unreadable`: a file that has problems has no datasets to save. */
  | { ok: false; reason: 'not-allowed' | 'unknown-file' | 'unreadable' | 'no-such-dataset' }
  /** The datasets that are there already; nothing was saved. */
  | { ok: false; reason: 'already-there'; already: NamedDataset[] }
  | { ok: false; reason: 'bad-conditions'; troubles: SaveTrouble[] };

/** Saves datasets of uploaded files with their conditions, all or none. */
export function saveDatasets(
  db: Database,
  actor: Actor,
  request: SaveRequest,
  now = Date.now()
): SavedDatasets {
  // Files are read before the database is locked: a large one takes a second.
  const read = partsToSave(db, actor, request);
  if (!read.ok) return read;
  return db.transaction(
    (tx): SavedDatasets => {
      if (!mayInTeam(tx, actor, 'upload')) return { ok: false, reason: 'not-allowed' };
      const already: NamedDataset[] = [];
      const troubles: SaveTrouble[] = [];
      const there = savedBefore(
        tx,
        actor,
        read.parts.map(({ facts }) => facts.digest)
      );
      for (const { fileId, index, part, again, facts, conditions } of read.parts) {
        const before = there(facts.digest, fileId, part).already;
        if (before.length === 0) continue;
        if (!again) already.push(...before);
        else if (before.some(({ name }) => name === conditions.name))
          troubles.push({
            fileId,
            index,
            problems: { name: 'There is one of this name from the same file: give it another.' }
          });
      }
      if (already.length > 0) return { ok: false, reason: 'already-there', already };
      if (troubles.length > 0) return { ok: false, reason: 'bad-conditions', troubles };
      const saved = read.parts.map((part) => insert(tx, actor, part, now));
      return { ok: true, saved };
    },
    { behavior: 'immediate' }
  );
}

function insert(
  tx: Pick<Database, 'select' | 'insert'>,
  actor: Actor,
  part: PartToSave,
  now: number
): NamedDataset {
  const { facts, conditions } = part;
  const id = newId();
  tx.insert(dataset)
    .values({
      ...conditions,
      id,
      teamId: actor.teamId,
      fileId: part.fileId,
      reading: JSON.stringify(part.choices),
      part: part.part,
      counts: facts.text,
      kind: facts.kind,
      digest: facts.digest,
      shots: facts.shots,
      mean: facts.mean,
      largest: facts.largest,
      createdBy: actor.personId,
      createdAt: now,
      updatedAt: now
    })
    .run();
  nameDevice(tx, { ...conditions, teamId: actor.teamId, createdBy: actor.personId }, now);
  const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
  const detail = { name: conditions.name, ...scriptOf(actor) };
  recordEvent(tx, { ...happening, action: 'dataset.upload', detail }, now);
  return { id, name: conditions.name };
}
