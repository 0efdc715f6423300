import type { Actor } from '$lib/server/services/access/actor';
import { readReport } from '$lib/server/services/reports/read-report';
import type { BundleInput } from '$lib/model/exports/bundle-input';
import type { RequestEvent } from '@sveltejs/kit';
import { problem } from '../../../../../problem';
import { unreadable } from '../../../../../unreadable';
import { attachment } from '../../datasets/attachment';

/**
 * A table of a report as a file, or problem details.
 *
 * @param which what the file's name ends in; '' for all numbers
 */
export function csvOfReport(
  { locals, params }: Pick<RequestEvent, 'locals'> & { params: { id: string } },
  actor: Actor,
  which: string,
  table: (document: BundleInput['document']) => string
): Response {
  const read = readReport(locals.db, actor, params.id);
  if (!read.ok)
    return problem({ status: 404, code: 'not-found', title: 'There is nothing at this address.' });
  const { number, conditions } = read.report;
  if (!read.document.ok) return unreadable(read.document.problem);
  const name = `${conditions.name}, report ${number}${which === '' ? '' : `, ${which}`}.csv`;
  return attachment(table(read.document.diagnosis), name, 'text/csv; charset=utf-8');
}
