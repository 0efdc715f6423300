import { cumulantsPlace } from '$lib/charts/cumulants-place';
import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import { expect, it } from 'vitest';
import { BLIND, DOCUMENTS } from './documents';
import { plainSpaces, readPdf } from './read-pdf';
import { textOf } from './text-of';

it('kinks as read: the chart of cumulants says in title, alternative and note that it leaves misreads out', async () => {
  const document = await DOCUMENTS.find(([name]) => name === 'kinks as read')![1]();
  const place = cumulantsPlace(document);
  expect('reason' in place ? null : place.beyond?.what).toBe('misreads');
  const input = { document, documentSha256: 'ab'.repeat(32), provenance: BLIND };
  const pdf = readPdf(await reportPdf(input, serverFonts, { compress: false }));
  const alts = [...pdf.objects.values()]
    .filter((object) => /\/S \/Figure\n/.test(object))
    .map((object) => textOf(object, 'Alt'));
  const title = /Not allowing for misreads, the cumulants lie (beyond|where|at the edge)/;
  expect(alts.filter((alt) => title.test(alt))).toHaveLength(1);
  const said = plainSpaces(pdf.marked.map(({ text }) => text).join(' '));
  expect(said).toMatch(title);
  expect(said).toContain('That ceiling has the misreads in it.');
});
