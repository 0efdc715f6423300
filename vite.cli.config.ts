import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vite';

const folder = fileURLToPath(new URL('./src/cli/', import.meta.url));

/**
 * Bundles the command line tools for Node: every src/cli/NAME.ts becomes build-cli/NAME.js. Only what is
 * compiled (the database driver, argon2) stays outside, so a command starts without reading node_modules; and what the
 * start command shares with the built server: the metrics of a process are kept in one place.
 */
export default defineConfig({
  resolve: {
    alias: {
      $lib: fileURLToPath(new URL('./src/lib', import.meta.url)),
      'brotli/decompress.js': fileURLToPath(new URL('./src/lib/pdf/type/no-woff2.ts', import.meta.url))
    }
  },
  build: {
    ssr: true,
    outDir: 'build-cli',
    emptyOutDir: true,
    copyPublicDir: false,
    target: 'node20',
    rollupOptions: {
      input: Object.fromEntries(
        readdirSync(folder)
          .filter((name) => name.endsWith('.ts'))
          .map((name) => [name.slice(0, -3), `${folder}${name}`])
      )
    }
  },
  ssr: { noExternal: true, external: ['better-sqlite3', '@node-rs/argon2', 'pino', 'prom-client'] }
});
