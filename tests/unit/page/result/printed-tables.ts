import { TESTS } from '$lib/model/labels';
import type { Diagnosis, Interval } from '$lib/stats/types';
import { plainSpaces } from '../../pdf/read-pdf';
import { unlike } from './same-digits';

export type Row = (string | number | null)[];

const interval = (name: string, { value, low, high }: Interval): Row => [name, value, low, high];

/** Every table, its columns by their heads, as the document has it: written out here, not taken from the charts. */
export function tablesOf(d: Diagnosis): Record<string, { heads: string[]; rows: Row[] }> {
  return {
    distribution: {
      heads: ['count', 'shots', 'share', 'low', 'high', 'best law'],
      rows: d.distribution.map((p) => [
        p.lump ? `${p.count}+` : `${p.count}`,
        ...[p.shots, p.observed, p.low, p.high, p.fitted]
      ])
    },
    tails: {
      heads: [
        'tail',
        'shots',
        'share',
        'low',
        'high',
        'best law',
        'Chernoff',
        'Chernoff, mean alone',
        'Hoeffding'
      ],
      rows: d.tails.points.map((p) => [
        `${p.side === 'high' ? '≥' : '≤'} ${p.count}`,
        ...[p.shots, p.observed, p.low, p.high, p.fitted, p.chernoff, p.meanChernoff, p.hoeffding]
      ])
    },
    cumulants: {
      heads: ['cumulant', 'value', 'low', 'high'],
      rows: [
        interval('κ₁, mean', d.moments.mean),
        interval('κ₂, variance', d.moments.variance),
        interval('κ₃', d.moments.third),
        interval('κ₄', d.moments.fourth),
        interval('κ₂/κ₁, Fano factor', d.moments.fano)
      ]
    },
    ceiling: {
      heads: ['quantity', 'value', 'low', 'high'],
      rows: [
        interval('variance', d.moments.variance),
        ['ceiling', d.moments.ceiling, null, null],
        interval('variance over ceiling', d.moments.dispersion),
        ['excess that matters', d.engine.tolerance, null, null]
      ]
    },
    levels: {
      heads: ['part', 'how many', 'probability of each, or mean'],
      rows: [
        ...d.fit.levels.map(({ p, trials }): Row => ['trials', trials, p]),
        ...(d.fit.poissonPart > 0 ? [['rare events, mean count', null, d.fit.poissonPart]] : [])
      ]
    },
    tests: {
      heads: ['test', 'p', 'p, all tests', 'smallest p'],
      rows: d.tests.map((t) => [TESTS[t.id], t.p, t.pAdjusted, t.smallestP])
    }
  };
}

/** The text of a page, exponents as they are printed elsewhere. */
export const textOf = (html: string): string =>
  plainSpaces(
    html
      .replace(/<!--[^]*?-->/g, '')
      .replace(/<sup[^>]*>([^<]*)<\/sup>/g, (_, power: string) =>
        [...power].map((sign) => (/\d/.test(sign) ? '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(sign)] : '⁻')).join('')
      )
      .replace(/<[^>]*>/g, '')
      .replaceAll('&nbsp;', ' ')
      .replaceAll('&lt;', '<')
      .replaceAll('&gt;', '>')
      .replaceAll('&amp;', '&')
  );

/** Rows of all tables of a page, a cell a text. */
export const rowsOfPage = (html: string): string[][] =>
  [...html.matchAll(/<tr[^>]*>([^]*?)<\/tr>/g)].map(([, row]) =>
    [...row.matchAll(/<t[hd][^>]*>([^]*?)<\/t[hd]>/g)].map(([, cell]) => textOf(cell))
  );

/** Rows of a table of the PDF: what follows its heads, as many as asked for. Heads are set anew on a new page. */
export function rowsOfPdf(cells: string[], heads: string[], rows: Row[], width: number): string[][] {
  const at = cells.findIndex((_, i) => heads.every((head, j) => cells[i + j] === head));
  const found: string[][] = [];
  for (let i = at + width; at >= 0 && found.length < rows.length && i < cells.length;) {
    const name = String(rows[found.length][0]);
    if (cells[i] === name) {
      found.push(cells.slice(i, i + width));
      i += width;
    } else i++;
  }
  return found;
}

/** What is wrong with rows as printed. */
export function wrongs(rows: string[][], wanted: { heads: string[]; rows: Row[] }, least: number): string[] {
  if (rows.length !== wanted.rows.length) return [`${rows.length} rows, not ${wanted.rows.length}`];
  return wanted.rows
    .flatMap((row, i) =>
      row.map((value, j) => {
        const said = rows[i][j];
        const where = `${wanted.heads[j]} of ${String(row[0])}: `;
        const wrong =
          typeof value === 'string'
            ? said.replaceAll(' ', '') === value.replaceAll(' ', '')
              ? ''
              : `"${said}"`
            : unlike(said, value, least);
        return wrong === '' ? '' : where + wrong;
      })
    )
    .filter((wrong) => wrong !== '');
}
