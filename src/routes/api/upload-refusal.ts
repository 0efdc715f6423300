import type { UploadedJson } from '$lib/server/services/datasets/upload-json';
import { TOO_LARGE } from '../(team)/team/[team=slug]/datasets/answers';
import type { Problem } from '../problem';
import { faults } from './answers';

/** Why an upload was not saved: each fault with its line, or its field. */
export function uploadRefusal(refused: Extract<UploadedJson, { ok: false }>): Problem {
  const unfit = (code: string, title: string, more: object): Problem => ({
    status: 422,
    code,
    title,
    ...more
  });
  switch (refused.reason) {
    case 'not-allowed':
      return {
        status: 403,
        code: 'not-allowed',
        title: 'The role this token has now does not allow that.'
      };
    case 'too-large':
      return TOO_LARGE;
    case 'empty':
      return unfit('empty', 'The body is empty.', {});
    case 'unreadable':
      return unfit(
        'unreadable',
        'The counts cannot be read. Nothing was saved.',
        faults(refused.problems, refused.more)
      );
    case 'several':
      return unfit('several', `This holds ${refused.datasets} datasets. Nothing was saved.`, {
        detail: 'Send one dataset in a request, or upload the file on the page of the team.'
      });
    case 'bad-fields':
      return unfit('bad-input', 'Some of that does not fit. Nothing was saved.', faults(refused.fields));
    case 'bad-conditions':
      return unfit(
        'bad-conditions',
        'Some conditions do not fit the counts. Nothing was saved.',
        faults(Object.entries(refused.problems).map(([at, message]) => ({ at, message })))
      );
    case 'already-there':
      return {
        status: 409,
        code: 'already-there',
        title: 'This is saved already, from the same bytes.',
        already: refused.already
      };
  }
}
