import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build, type Plugin, type Rolldown } from 'vite';

const root = fileURLToPath(new URL('.', import.meta.url));
const source = join(root, 'src/lib/charts/reading/first-reading.ts');
const NAME = 'virtual:first-reading';

/** The script that comes inside pages with charts, as text: the module `virtual:first-reading` exports it. */
export const firstReading = (): Plugin => ({
  name: 'severalty-first-reading',
  resolveId: (id) => (id === NAME ? `\0${NAME}` : undefined),
  async load(id) {
    if (id !== `\0${NAME}`) return;
    this.addWatchFile(source);
    const [{ output }] = (await build({
      configFile: false,
      root,
      logLevel: 'warn',
      build: {
        write: false,
        // A file name is asked for, although none is written.
        lib: { entry: source, formats: ['iife'], name: 'firstReading', fileName: 'first-reading' }
      }
    })) as Rolldown.RolldownOutput[];
    return `export default ${JSON.stringify(output[0].code.trim())};`;
  }
});
