import { bundleFiles } from '$lib/model/exports/bundle-files';
import { withheldFiles } from '$lib/model/exports/withheld-files';
import { zipBundle } from '$lib/model/exports/zip-bundle';
import { summaryText } from '$lib/model/link/summary-text';
import { chartFiles } from '$lib/charts/chart-files';
import { bundleOfLink } from '$lib/server/services/links/bundle-of-link';
import { openLink } from '$lib/server/services/links/open-link';
import { beforeAll, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { linked, SECRETS, shared } from '../../../../support/links';
import { BLIND } from '../../../pdf/documents';
import { unzipSync } from 'fflate';
import { writeReport } from '$lib/server/pdf/write-report';
import type { Diagnosis } from '$lib/stats/types';

let db: ReturnType<typeof freshDatabase>;
let there: Awaited<ReturnType<typeof shared>>;

beforeAll(async () => {
  db = freshDatabase();
  there = await shared(db);
});

/** The files that a link's bundle holds, by name within its folder, and the link's own view and token. */
async function filesOf(more: Parameters<typeof linked>[3]) {
  const { token } = linked(db, there.lead, there.reportId, more);
  const opened = openLink(db, token, null, 3000);
  if (!opened.ok) throw new Error(opened.reason);
  const made = await bundleOfLink(opened.view);
  if (!made.ok) throw new Error(made.problem);
  const bundle =
    made.kind === 'whole'
      ? bundleFiles({ ...made.input, charts: chartFiles(made.input.document, made.dataset) })
      : withheldFiles(made.summary, made.about);
  const files = Object.entries(unzipSync(zipBundle(bundle)));
  const decoder = new TextDecoder('latin1');
  const utf8 = new TextDecoder();
  return {
    files: new Map(files.map(([path, bytes]) => [path.slice(path.indexOf('/') + 1), utf8.decode(bytes)])),
    all: files.map(([path, bytes]) => `${path}\n${decoder.decode(bytes)}\n${utf8.decode(bytes)}`).join('\n'),
    view: opened.view,
    pdf: files.find(([path]) => path.endsWith('report.pdf'))?.[1],
    token
  };
}

const secrets = [...Object.values(SECRETS), '2031-02-03', 'original/'];

describe('the bundle of a link', () => {
  it('that shows the counts holds the document as stored, the conditions, and not the token', async () => {
    const { files, all, view, token } = await filesOf({});
    if (view.content.kind !== 'whole') throw new Error('kept back');
    expect(files.get('document.json')).toBe(view.content.document);
    expect(files.get('conditions.json')).toContain(SECRETS.device);
    expect(files.get('README.txt')).toContain(SECRETS.team);
    expect([...files.keys()]).toEqual(expect.arrayContaining(['report.pdf', 'counts.csv', 'tails.csv']));
    expect([...files.keys()].filter((path) => path.startsWith('original'))).toEqual([]);
    expect(all).not.toContain(token);
  });

  it('that is blind names nobody in any file, and has no conditions', async () => {
    const { files, all, view, pdf } = await filesOf({ blind: true });
    expect(files.has('document.json')).toBe(true);
    expect(files.has('conditions.json')).toBe(false);
    for (const secret of secrets) expect(all.includes(secret), secret).toBe(false);
    // Its text is packed: that it names nobody is shown by the very bytes of a report that was told of nobody.
    if (view.content.kind !== 'whole') throw new Error('kept back');
    const { document: text, sha256 } = view.content;
    const nameless = await writeReport({
      document: JSON.parse(text) as Diagnosis,
      documentSha256: sha256,
      provenance: { ...BLIND, conditions: view.times }
    });
    expect(pdf && Buffer.compare(pdf, nameless)).toBe(0);
    // What the test looks for is found where it is not hidden.
    expect((await filesOf({})).all).toContain(SECRETS.device);
  });

  it.each([true, false])('that keeps the counts back has the summary alone, blind %s', async (blind) => {
    const { files, all, view } = await filesOf({ shows: 'report', blind });
    if (view.content.kind !== 'without-counts') throw new Error('shown');
    expect([...files.keys()]).toEqual(['README.txt', 'summary.json', 'SHA256SUMS']);
    expect(files.get('summary.json')).toBe(summaryText(view.content.summary));
    // Numbers of shots, each of which tells one count: none of them, nor the digest that a guess could be held to.
    expect(all.replace(/\b[0-9a-f]{64}\b/g, '')).not.toMatch(/\b(409|611|523|347|163)\b|sha256:/);
    for (const secret of secrets) expect(all.includes(secret) && blind, secret).toBe(false);
    expect(all.includes(SECRETS.team)).toBe(!blind);
  });
});
