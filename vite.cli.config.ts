import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vite';

/** Bundles the command line tools for Node; packages in `dependencies` stay outside. */
export default defineConfig({
  resolve: { alias: { $lib: fileURLToPath(new URL('./src/lib', import.meta.url)) } },
  build: {
    ssr: true,
    outDir: 'build-cli',
    emptyOutDir: true,
    copyPublicDir: false,
    target: 'node20',
    rollupOptions: {
      input: {
        start: 'src/cli/start.ts',
        diagnose: 'src/cli/diagnose.ts',
        seed: 'src/cli/seed.ts',
        calibrate: 'src/cli/calibrate.ts',
        bench: 'src/cli/bench.ts'
      }
    }
  },
  ssr: { noExternal: ['papaparse'], external: ['better-sqlite3'] }
});
