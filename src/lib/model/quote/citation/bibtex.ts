import { escapeLatex } from '../notation/escape-latex';
import { oneLine } from '../notation/one-line';
import { latexCode } from '../notation/to-latex';
import type { Provenance } from '../provenance';
import type { Quotable } from '../quotable';
import { bibtexKey } from './bibtex-key';

const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

/**
 * A BibTeX entry of the report, @misc: by its address where it has one, and by its digests.
 *
 * The address stands twice: in `howpublished`, since the classic styles know no `url` and would lose it, and in `url`
 * for those that do. Names are in braces of their own, so that no style parts, inverts or lowers them. A report whose
 * makers are hidden has "Severalty report" for its author.
 */
export function bibtex(quotable: Pick<Quotable, 'data' | 'engine'>, provenance: Provenance): string {
  const { team, madeAt, url, sha256 } = provenance;
  const { digest } = quotable.data;
  const made = madeAt === null ? null : new Date(madeAt);
  const fields: [string, string | null][] = [
    ['author', `{{${team === null ? 'Severalty report' : typed(team)}}}`],
    ['title', `{${title(provenance)}}`],
    ['year', made && `{${made.getUTCFullYear()}}`],
    ['month', made && MONTHS[made.getUTCMonth()]],
    ['howpublished', url && `{${address(url)}}`],
    ['url', url && `{${encodeURI(decodeURI(url))}}`],
    [
      'note',
      `{${[
        ...(sha256 ? [`Document sha256 ${latexCode(sha256)}`] : []),
        ...(digest ? [`counts sha256 ${latexCode(digest.replace(/^sha256:/, ''))}`] : []),
        `Severalty engine ${typed(quotable.engine.version)}`
      ].join(', ')}}`
    ]
  ];
  const lines = fields.flatMap(([name, value]) => (value === null ? [] : [`  ${name} = ${value}`]));
  return `@misc{${bibtexKey(provenance, digest)},\n${lines.join(',\n')}\n}`;
}

/** An address may break after its slashes. */
const address = (url: string): string =>
  `\\texttt{${url
    .split(/(?<=[^/:]\/)/)
    .map((part) => escapeLatex(part))
    .join('\\allowbreak{}')}}`;

const typed = (text: string): string => escapeLatex(oneLine(text));

function title({ name, number }: Provenance): string {
  const about = 'counts of defects held against independent trials';
  const of = name === null ? '' : ` on {${typed(name)}}`;
  if (number === null)
    return of
      ? `Diagnosis of {${typed(name!)}}: ${about}`
      : `Counts of defects held against independent trials`;
  return `Report ${number}${of}: ${about}`;
}
