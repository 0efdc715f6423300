import { notInArray } from 'drizzle-orm';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Database } from '../db/client';
import { sample } from '../db/schema';
import { projectFolder } from '../project-folder';
import { CATALOGUE } from './sample-catalogue';

/**
 * Makes the sample table agree with the shipped catalogue: new samples come in, changed ones are replaced,
 * dropped ones go. Samples belong to the application and nobody edits them, so nothing can be lost.
 *
 * @returns how many samples there are now
 * @throws when a file of the catalogue is missing
 */
export function seedSamples(db: Database, folder = join(projectFolder(), 'fixtures')): number {
  const rows = CATALOGUE.map(({ file, ...entry }, order) => {
    const path = join(folder, file);
    if (!existsSync(path)) throw new Error(`The sample file fixtures/${file} is missing.`);
    return { ...entry, fileName: file.replace(/^.*\//, ''), text: readFileSync(path, 'utf8'), order };
  });
  db.transaction(
    (tx) => {
      for (const row of rows) {
        tx.insert(sample).values(row).onConflictDoUpdate({ target: sample.slug, set: row }).run();
      }
      tx.delete(sample)
        .where(
          notInArray(
            sample.slug,
            rows.map((row) => row.slug)
          )
        )
        .run();
    },
    { behavior: 'immediate' }
  );
  return rows.length;
}
