import type { BundleInput } from '$lib/model/exports/bundle-input';
import { readReport } from '$lib/server/services/reports/read-report';
import type { RequestEvent } from '@sveltejs/kit';
import { attachment } from '../(team)/team/[team=slug]/datasets/attachment';
import type { AskedToken } from '../ask-token';
import { problem } from '../problem';
import { damaged, NOT_HERE } from './answers';

/**
 * A table of a report as a file, or problem details.
 *
 * @param which what the file's name ends in; '' for all numbers
 */
export function csvOfReport(
  { locals, params }: Pick<RequestEvent, 'locals'> & { params: { id: string } },
  { actor }: Extract<AskedToken, { ok: true }>,
  which: string,
  table: (document: BundleInput['document']) => string
): Response {
  const read = readReport(locals.db, actor, params.id);
  if (!read.ok) return problem(NOT_HERE);
  if (!read.document.ok) return problem(damaged(read.document.problem));
  const { number, conditions } = read.report;
  const name = `${conditions.name}, report ${number}${which === '' ? '' : `, ${which}`}.csv`;
  return attachment(table(read.document.diagnosis), name, 'text/csv; charset=utf-8');
}
