import { conditionsTable } from '$lib/charts/conditions-table';
import { nearestTable } from '$lib/charts/nearest-table';
import { judgeCumulants } from '$lib/stats/cumulants-only/judge-cumulants';
import { ceilingTable } from '$lib/charts/ceiling-table';
import { cumulantsTable } from '$lib/charts/cumulants-table';
import { distributionTable } from '$lib/charts/distribution-table';
import { levelsTable } from '$lib/charts/levels-table';
import { rateTable } from '$lib/charts/rate-table';
import { referencesTable } from '$lib/charts/references-table';
import { answersTable } from '$lib/charts/answers-table';
import { ratioTable } from '$lib/charts/ratio-table';
import { sweepDispersionTable } from '$lib/charts/sweep-dispersion-table';
import { sweepTable } from '$lib/charts/sweep-table';
import { windowsTable } from '$lib/charts/windows-table';
import { sweepReport } from '$lib/stats/sweep/sweep-report';
import type { Table } from '$lib/charts/table';
import { tailsTable } from '$lib/charts/tails-table';
import { testsTable } from '$lib/charts/tests-table';
import { FLAGS, TESTS } from '$lib/model/labels';
import { dataFacts } from '$lib/model/report/data-facts';
import { engineFacts } from '$lib/model/report/engine-facts';
import { sayNuisances } from '$lib/model/report/say-nuisances';
import { PLAIN_TITLES, termOfTitle } from '$lib/model/terms/term-of-title';
import { CHILDREN, type MathNode } from '$lib/model/terms/math-node';
import { readFormula } from '$lib/model/terms/read-formula';
import { PLANNING } from '$lib/model/terms/planning';
import { SWEEPS } from '$lib/model/terms/sweeps';
import { TERMS, type TermId } from '$lib/model/terms/terms';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { describe, expect, it } from 'vitest';
import { sourceFiles } from '../../../support/source-files';

const entries = Object.entries(TERMS);
const SECTIONS = sourceFiles(['src/lib/page/result']);
/** Pages that have margins of their own. */
const APART = sourceFiles(['src/lib/page/cumulants', 'src/lib/page/plan', 'src/lib/page/team/sweeps']);

describe('each term', () => {
  it.each(entries)('%s: two sentences', (_, { words }) => {
    for (const sentence of words) {
      expect(sentence).toMatch(/^[A-ZΑ-Ω0-9][^\n]*[.?]$/);
      // No second sentence hides in one: nothing ends one before its own end.
      expect(sentence.slice(0, -1)).not.toMatch(/[.?!](\s|$)/);
      expect(sentence.length).toBeLessThanOrEqual(230);
    }
  });

  it.each(entries)('%s: none of the words that promise too much', (_, { name, words }) => {
    const text = [name, ...words].join(' ');
    expect(text).not.toMatch(
      /\bprov(e|es|en|ing)\b|\bproofs?\b|\bsignificant|\bobvious|\bsimply\b|\bclearly\b/i
    );
    expect(text).not.toMatch(/\bwe\b|\bour\b|e\.g\.|i\.e\.| - | -\d/i);
    // Independence is never what agreeing counts show.
    expect(text).not.toMatch(/\b(are|is) independent\b(?!, or| of each| things?|\.$)/i);
  });

  it.each(entries)('%s: formulas are well-formed MathML', (_, { formula }) => {
    for (const line of formula) {
      const nodes = readFormula(line);
      expect(nodes.length).toBeGreaterThan(0);
      nodes.forEach(wellFormed);
    }
  });
});

describe('every term that a report uses', () => {
  it('has a note: each test and each flag', () => {
    for (const id of Object.keys(TESTS)) expect(TERMS).toHaveProperty(`test-${id}`);
    for (const id of Object.keys(FLAGS)) expect(TERMS).toHaveProperty(`flag-${id}`);
  });

  it('has a note: each title of a table or fact, but for the plain ones', async () => {
    const diagnosis = await diagnose(
      {
        kind: 'histogram',
        counts: [
          [0, 40],
          [1, 35],
          [2, 20],
          [3, 5]
        ],
        lump: null
      },
      { ...defaultOptions, resamples: 19 }
    );
    const inWords: Table[] = [
      cumulantsTable(diagnosis),
      referencesTable(diagnosis),
      ceilingTable(diagnosis),
      levelsTable(diagnosis)
    ];
    const measured = { value: 3, error: 0.1 };
    const printed = { trials: null, mean: measured, variance: measured, third: measured, fourth: measured };
    const judged = judgeCumulants(printed);
    inWords.push(nearestTable(printed, judged));
    const all = [
      ...inWords,
      conditionsTable(judged.conditions),
      distributionTable(diagnosis),
      rateTable(diagnosis),
      tailsTable(diagnosis),
      testsTable(diagnosis, TESTS),
      ...sweepTables()
    ];
    const titles = [
      ...all.flatMap(({ columns }) => columns.map(({ title }) => title)),
      ...inWords.flatMap(({ rows }) => rows.map((row) => String(row[0]))),
      ...Object.values(TESTS),
      ...dataFacts(diagnosis, 'a name').map(([what]) => what),
      ...engineFacts(diagnosis).map(([what]) => what),
      ...sayNuisances(diagnosis, null).map(([what]) => what)
    ];
    expect(titles.filter((title) => !termOfTitle(title) && !PLAIN_TITLES.has(title))).toEqual([]);
    expect(titles.filter((title) => termOfTitle(title) && PLAIN_TITLES.has(title))).toEqual([]);
  });

  it('stands in one part of the report and no more', () => {
    const termsOf = (files: typeof SECTIONS) =>
      files.flatMap(({ text }) =>
        [...text.matchAll(/<Terms\s+of=\{([\s\S]*?)\}\s*(?:guide|\/>)/g)].flatMap(([, list]) =>
          [...list.matchAll(/'([a-z-]+)'/g)].map(([, id]) => id)
        )
      );
    const placed = termsOf(SECTIONS);
    // The tests' part lists the tests' own terms in its script, and each test by its id.
    const ofTests = /const TESTS_HERE = \[([\s\S]*?)\];/.exec(
      SECTIONS.find(({ path }) => path.endsWith('TestsSection.svelte'))?.text ?? ''
    );
    placed.push(...[...(ofTests?.[1] ?? '').matchAll(/'([a-z-]+)'/g)].map(([, id]) => id));
    const byId = (id: string) => /^(test|flag)-/.test(id);
    // 'flag' is written once, in the two-way choice of the first flag.
    const wanted = (Object.keys(TERMS) as TermId[]).filter((id) => !byId(id)).sort();
    // A term of a page of its own need not stand in the report.
    placed.push(...Object.keys({ ...PLANNING, ...SWEEPS }).filter((id) => termsOf(APART).includes(id)));
    expect(placed.sort()).toEqual(wanted);
  });
});

/** Tables of a sweep over hold times, which has all of them, without a unit that would stand in a title. */
function sweepTables(): Table[] {
  const sweep = sweepReport(
    [1, 2, 4].map((time) => ({
      label: `${time}`,
      time,
      counts: [0, 1, 2, 3].map((n): [number, number] => [n, 40 - 9 * n])
    })),
    { axis: 'hold-time', timeUnit: '', unit: 'defect', window: null, transition: null, alpha: 0.05 }
  );
  expect(sweep.steady).toHaveLength(3);
  return [
    sweepTable(sweep),
    windowsTable(sweep),
    answersTable(sweep),
    sweepDispersionTable(sweep),
    ...sweep.steady.map(({ id }) => ratioTable(sweep, id))
  ];
}

function wellFormed(node: MathNode): void {
  if (!('children' in node)) {
    expect(node.text).not.toBe('');
    expect(node.text).not.toMatch(/[<>&]{2,}|[{}_^"]{2,}/);
    return;
  }
  const wanted = CHILDREN[node.tag];
  if (wanted !== null) expect(node.children).toHaveLength(wanted);
  node.children.forEach(wellFormed);
}
