import { mkdirSync, renameSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build, type Plugin, type Rolldown } from 'vite';

const root = fileURLToPath(new URL('.', import.meta.url));
/** Not below build/, which adapter-node empties. */
const folder = join(root, 'build-worker');
/** What the worker is made of. */
const sources = ['src/lib/stats', 'src/lib/server/jobs'].map((path) => join(root, path));

/**
 * Builds the threads that run diagnoses: Vite does not bundle `new Worker(new URL(…))` in server code. Done when the
 * application is built, when the development server starts or a source of the engine changes, and before tests.
 */
export function jobWorker(): Plugin {
  let once: Promise<void> | null = null;
  let forServer = false;
  return {
    name: 'severalty-job-worker',
    configResolved(config) {
      forServer = config.command === 'build' && Boolean(config.build.ssr);
    },
    async buildStart() {
      if (forServer) await (once ??= buildWorker());
    },
    async configureServer(server) {
      // A source that does not parse must not keep the rest from being looked at.
      const attempt = () =>
        buildWorker().catch((error: unknown) =>
          server.config.logger.error(`build-worker/ was not built: ${String(error)}`)
        );
      await attempt();
      let soon: NodeJS.Timeout | undefined;
      server.watcher.on('change', (path) => {
        if (!sources.some((source) => resolve(path).startsWith(source))) return;
        clearTimeout(soon);
        soon = setTimeout(attempt, 200);
      });
    }
  };
}

async function buildWorker(): Promise<void> {
  const built = (await build({
    configFile: false,
    root,
    logLevel: 'warn',
    resolve: { alias: { $lib: join(root, 'src', 'lib') } },
    build: {
      ssr: join(root, 'src/lib/server/jobs/worker.ts'),
      write: false,
      target: 'node20',
      rollupOptions: { output: { entryFileNames: 'worker.js' } }
    },
    ssr: { noExternal: true }
  })) as Rolldown.RolldownOutput;
  mkdirSync(folder, { recursive: true });
  for (const file of built.output) {
    // Renamed when whole: tests, a build and a development server may do this at once, while a thread reads it.
    const part = join(folder, `.${file.fileName}.${process.pid}`);
    writeFileSync(part, file.type === 'chunk' ? file.code : file.source);
    renameSync(part, join(folder, file.fileName));
  }
}
