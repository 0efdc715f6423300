import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { sampleBySlug } from '../samples';
import { previewFile } from './preview-file';
import { saveDatasets, type SavedDatasets } from './save-datasets';
import { storeFile } from './store-file';

/** Saves an example that comes with the application as datasets of the team, so that there is something to look at. */
export function takeSample(
  db: Database,
  actor: Actor,
  slug: string,
  now = Date.now()
): SavedDatasets | { ok: false; reason: 'unknown-sample' } {
  const found = sampleBySlug(db, slug);
  if (!found.ok) return { ok: false, reason: 'unknown-sample' };
  const { title, about, source, invented, trials, unit, geometry, fileName, text } = found.sample;
  const stored = storeFile(db, actor, { name: fileName, bytes: new TextEncoder().encode(text) }, now);
  if (!stored.ok)
    return { ok: false, reason: stored.reason === 'not-allowed' ? 'not-allowed' : 'unreadable' };
  const read = previewFile(db, actor, stored.file.id, {});
  if (!read.ok) return { ok: false, reason: 'not-allowed' };
  const notes = `${invented ? 'Invented example.' : 'Published example.'} ${about} ${source}`;
  const several = read.preview.datasets.length > 1;
  const datasets = read.preview.datasets.map(({ index, conditions }) => ({
    index,
    conditions: {
      ...conditions,
      name: several ? `${title}: ${conditions.name}`.slice(0, 200) : title,
      trials,
      trialsWhy: trials === null ? null : 'As the example says.',
      unit,
      geometry,
      notes
    }
  }));
  if (datasets.length === 0) return { ok: false, reason: 'unreadable' };
  return saveDatasets(
    db,
    actor,
    { files: [{ fileId: stored.file.id, choices: {}, again: false, datasets }] },
    now
  );
}
