import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/**
 * The folder that holds `drizzle/` and `fixtures/`, found upwards from this module. The same source runs
 * from src/, build/server/ and build-cli/, at different depths, and the working folder may be anywhere.
 *
 * @throws when no folder above holds the migrations (a build copied somewhere without them)
 */
export function projectFolder(): string {
  const start = dirname(fileURLToPath(import.meta.url));
  for (let folder = start; ; folder = dirname(folder)) {
    if (existsSync(join(folder, 'drizzle', 'meta', '_journal.json'))) return folder;
    if (dirname(folder) === folder)
      throw new Error(`No drizzle/ folder above ${start}: the migrations must lie beside the build.`);
  }
}
