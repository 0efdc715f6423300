import { execFileSync } from 'node:child_process';
import { copyFileSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

/** One breach of each rule: rule, importing file, what it imports. */
const BREACHES: [rule: string, file: string, imported: string][] = [
  ['no-circular', 'src/lib/ui/first.ts', './second'],
  ['not-resolvable', 'src/lib/ui/lost.ts', '$lib/ui/nowhere'],
  ['no-undeclared-package', 'src/lib/ui/undeclared.ts', 'acorn'],
  ['stats-imports', 'src/lib/stats/reader.ts', '../formats/thing'],
  ['stats-is-pure', 'src/lib/stats/package.ts', 'd3-scale'],
  ['stats-is-pure', 'src/lib/stats/file.ts', 'node:fs'],
  ['model-imports', 'src/lib/model/chart.ts', '$lib/charts/thing'],
  ['formats-imports', 'src/lib/formats/chart.ts', '$lib/charts/thing'],
  ['charts-imports', 'src/lib/charts/reader.ts', '$lib/formats/thing'],
  ['charts-imports', 'src/lib/charts/Reader.svelte', '$lib/formats/thing'],
  ['ui-imports', 'src/lib/ui/Counts.svelte', '$lib/stats/thing'],
  ['page-imports', 'src/lib/page/server.ts', '$lib/server/log'],
  ['server-env-imports', 'src/lib/server/env.ts', './log'],
  ['server-project-folder-imports', 'src/lib/server/project-folder.ts', './log'],
  ['server-running-imports', 'src/lib/server/running/thing.ts', '../log'],
  ['server-log-imports', 'src/lib/server/log.ts', '$lib/stats/thing'],
  ['server-db-imports', 'src/lib/server/db/client.ts', '../services/thing'],
  ['server-auth-imports', 'src/lib/server/auth/login.ts', '../services/thing'],
  ['server-access-imports', 'src/lib/server/access/can.ts', '../services/thing'],
  ['server-mail-imports', 'src/lib/server/mail/letter.ts', '../services/thing'],
  ['server-jobs-imports', 'src/lib/server/jobs/runner.ts', '../services/thing'],
  ['pdf-imports', 'src/lib/pdf/report.ts', '$lib/formats/thing'],
  ['pdf-runs-anywhere', 'src/lib/pdf/file.ts', 'node:fs'],
  ['server-pdf-imports', 'src/lib/server/pdf/fonts.ts', '$lib/formats/thing'],
  ['server-services-imports', 'src/lib/server/services/datasets.ts', '$lib/ui/thing'],
  ['routes-imports', 'src/routes/+page.server.ts', '$lib/server/db/client'],
  ['routes-imports', 'src/routes/+page.svelte', '$lib/stats/thing'],
  ['page-never-server', 'src/routes/+layout.svelte', '$lib/server/services/thing'],
  ['page-never-server', 'src/routes/+layout.ts', '$lib/server/services/thing'],
  ['page-never-server', 'src/lib/charts/secret.ts', '$lib/server/services/thing'],
  ['nobody-imports-cli-or-routes', 'src/lib/ui/tool.ts', '../../cli/start']
];

/** Imports that the rules must let through. */
const ALLOWED: [file: string, imported: string][] = [
  ['src/lib/formats/thing.ts', '$lib/stats/thing'],
  ['src/lib/charts/thing.ts', '$lib/stats/thing'],
  ['src/lib/charts/Thing.svelte', './thing'],
  ['src/lib/server/services/thing.ts', '../db/schema'],
  ['src/lib/server/db/schema.ts', 'drizzle-orm/sqlite-core'],
  ['src/routes/Thing.svelte', '$lib/charts/Thing.svelte'],
  ['src/routes/samples/+server.ts', '$lib/server/services/thing'],
  ['src/cli/start.ts', '$lib/server/db/schema']
];

const EMPTY = ['src/lib/stats/thing.ts', 'src/lib/ui/thing.ts'];

let folder: string;
let found: Set<string>;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'severalty-rules-'));
  for (const name of ['.dependency-cruiser.cjs', '.dependency-aliases.cjs', 'package.json']) {
    copyFileSync(name, join(folder, name));
  }
  symlinkSync(resolve('node_modules'), join(folder, 'node_modules'));
  write('tsconfig.json', '{}');
  for (const file of EMPTY) write(file, 'export const thing = 1;\n');
  for (const [file, imported] of ALLOWED) write(file, source(file, imported));
  for (const [, file, imported] of BREACHES) write(file, source(file, imported));
  write('src/lib/ui/second.ts', source('second.ts', './first'));
  found = breaches();
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the import rules', () => {
  it.each(BREACHES)('%s refuses %s importing %s', (rule, file) => {
    expect([...found]).toContain(`${rule} ${file}`);
  });

  it.each(ALLOWED)('let %s import %s', (file) => {
    expect([...found].filter((line) => line.endsWith(` ${file}`))).toEqual([]);
  });

  it('have a breach planted for each of them', () => {
    const config = createRequire(import.meta.url)(resolve('.dependency-cruiser.cjs')) as {
      forbidden: { name: string }[];
    };
    const planted = new Set(BREACHES.map(([rule]) => rule));
    expect(config.forbidden.map((rule) => rule.name).filter((name) => !planted.has(name))).toEqual([]);
  });
});

function write(path: string, text: string): void {
  mkdirSync(dirname(join(folder, path)), { recursive: true });
  writeFileSync(join(folder, path), text);
}

function source(file: string, imported: string): string {
  const code = `import * as other from '${imported}';\nexport const name = [other];\n`;
  if (!file.endsWith('.svelte')) return code;
  return `<script lang="ts">\n  import * as other from '${imported}';\n</script>\n\n<p>{String(other)}</p>\n`;
}

/** "rule file" for each breach that the tool reports. */
function breaches(): Set<string> {
  const tool = resolve('node_modules/dependency-cruiser/bin/dependency-cruise.mjs');
  const args = [tool, '--config', '.dependency-cruiser.cjs', 'src', '--output-type', 'json'];
  const report = JSON.parse(
    execFileSync(process.execPath, args, { cwd: folder, encoding: 'utf8', maxBuffer: 1e8 })
  ) as {
    summary: { violations: { rule: { name: string }; from: string }[] };
  };
  return new Set(report.summary.violations.map(({ rule, from }) => `${rule.name} ${from}`));
}
