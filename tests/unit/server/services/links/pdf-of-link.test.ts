import { summaryCumulantsTable, summaryTestsTable } from '$lib/charts/summary-tables';
import { alignedColumn } from '$lib/charts/aligned-column';
import { summaryFacts } from '$lib/model/link/summary-facts';
import { pdfOfLink } from '$lib/server/services/links/pdf-of-link';
import { openLink } from '$lib/server/services/links/open-link';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { linked, nineCounts, shared } from '../../../../support/links';
import { plainSpaces, readPdf } from '../../../pdf/read-pdf';

const NAMES = /quagga|okapi|zebu|wombat|ibex|numbat|gnus/i;

/** The PDF of a link: its text, everything in the file that a reader could find, and what the page was given. */
async function open(shows: 'report' | 'report-and-counts', blind: boolean) {
  const db = freshDatabase();
  const { lead, reportId } = await shared(db);
  const { token } = linked(db, lead, reportId, { shows, blind });
  const opened = openLink(db, token, null, 3000);
  if (!opened.ok) throw new Error(opened.reason);
  const made = await pdfOfLink(opened.view);
  if (!made.ok) throw new Error(made.problem);
  const read = readPdf(made.bytes);
  // Titles and the like are UTF-16 where they must be; that is latin text with zeros between.
  const file = [...read.objects.values()].join('\n').replaceAll('\0', '');
  const feet = read.marked.map(({ text }) => text).join('\n');
  return { made, read, view: opened.view, token, everything: `${file}\n${feet}` };
}

describe('the PDF of a link', () => {
  it.each(['report', 'report-and-counts'] as const)(
    'that shows the %s names nobody when blind',
    async (shows) => {
      const blind = await open(shows, true);
      expect(NAMES.test(blind.everything)).toBe(false);
      // The day of measuring; four digits in a row also stand in the file's own numbers.
      expect(blind.read.text).not.toContain('2031');
      expect(blind.everything).not.toContain('/Author');
      expect(
        blind.everything.match(/\(D:\d{14}Z\)/g)?.every((date) => date.startsWith('(D:1970010100'))
      ).toBe(true);
      const told = await open(shows, false);
      expect(NAMES.test(told.everything)).toBe(true);
      expect(told.read.text).toContain('2031');
      for (const name of ['Quaggalab', 'Okapitron', 'fw-zebu-7', 'Wombat run', 'asked by Ibexia', '4 gnus'])
        expect(told.read.text).toContain(name);
      for (const { everything, token } of [blind, told]) expect(everything).not.toContain(token);
      expect(blind.made.bytes.length).toBeLessThan(300_000);
    }
  );

  it('tells no count, share, digest or seed where the counts are kept back, and draws nothing', async () => {
    const { read, everything } = await open('report', false);
    const shots =
      nineCounts.kind === 'histogram' ? nineCounts.counts.map(([, n]) => n).filter((n) => n > 100) : [];
    expect(shots).toEqual([137, 409, 611, 523, 347, 163]);
    for (const n of shots) expect(read.text).not.toMatch(new RegExp(`(?<![.\\d])${n}(?![.\\d])`));
    expect(everything).not.toMatch(/sha256:/);
    // The note that says what is missing names the seed; no line gives one.
    expect(read.marked.filter(({ tag, text }) => tag === 'Lbl' && /Seed|Resampled/.test(text))).toEqual([]);
    expect(everything).not.toMatch(/seed \d/);
    expect([...read.objects.values()].some((object) => /\/S \/Figure\n/.test(object))).toBe(false);
    const whole = await open('report-and-counts', false);
    for (const n of shots) expect(whole.read.text).toMatch(new RegExp(`(?<![.\\d])${n}(?![.\\d])`));
    expect(whole.everything).toMatch(/sha256/);
  });

  it('shows what its page shows: sentences, facts and every number', async () => {
    const { read, view } = await open('report', true);
    if (view.content.kind !== 'without-counts') throw new Error('counts');
    const { summary } = view.content;
    const said = [
      summary.answer.statement,
      ...summary.answer.because,
      ...summary.cautions,
      ...summary.flags.flatMap((flag) => [flag.statement, flag.size, ...flag.otherCauses, ...flag.next]),
      ...summaryFacts(summary).flat()
    ];
    for (const words of said) expect(read.text).toContain(plainSpaces(words));
    for (const [table, digits] of [
      [summaryCumulantsTable(summary), undefined],
      [summaryTestsTable(summary), 2]
    ] as const)
      table.columns.forEach(({ kind }, i) => {
        const column = table.rows.map((row) => row[i]);
        for (const cell of alignedColumn(column, kind, digits))
          expect(read.text).toContain(plainSpaces(cell));
      });
    expect(read.unmarked).toEqual([]);
  });
});
