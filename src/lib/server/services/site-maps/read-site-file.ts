import { maxMapBytes } from '../../../formats/sites/limits';
import { readSites } from '../../../formats/sites/read-sites';
import type { FileProblem } from '../../../model/team/datasets/preview';
import { sitesReport } from '../../../stats/sites/sites-report';
import type { SitesInput, SitesOptions, SitesReport } from '../../../stats/sites/sites-types';
import { BadInput } from '../../../stats/types';

export type ReadSiteFile =
  | { ok: true; input: SitesInput; report: SitesReport }
  | { ok: false; reason: 'too-large' | 'empty' }
  | { ok: false; reason: 'unreadable'; problems: FileProblem[]; more: number };

/** The map of a file of site-resolved shots, or why there is none, with line and column. */
export function readSiteFile(bytes: Uint8Array, options: SitesOptions): ReadSiteFile {
  if (bytes.length > maxMapBytes) return { ok: false, reason: 'too-large' };
  if (bytes.length === 0) return { ok: false, reason: 'empty' };
  const read = readSites(new TextDecoder().decode(bytes));
  if (!read.ok) return { ok: false, reason: 'unreadable', problems: read.problems, more: read.more };
  const input = { names: read.sites, shots: read.shots };
  try {
    return { ok: true, input, report: sitesReport(input, options) };
  } catch (error) {
    if (!(error instanceof BadInput)) throw error;
    const problem = { line: null, column: null, message: error.reason, fix: 'Send other shots.' };
    return { ok: false, reason: 'unreadable', problems: [problem], more: 0 };
  }
}
