import { readingChoicesSchema } from '$lib/model/team/datasets/reading-choices';
import { previewFile } from '$lib/server/services/datasets/preview-file';
import { storeFile } from '$lib/server/services/datasets/store-file';
import { json } from '@sveltejs/kit';
import { z } from 'zod';
import { askTeamJson } from '../../../../../ask-json';
import { problem } from '../../../../../problem';
import { answering, bodyTrouble, TOO_LARGE } from '../answers';
import { readJson } from '../read-json';
import type { RequestHandler } from './$types';

const again = z.strictObject({ fileId: z.string().min(1).max(64), choices: readingChoicesSchema });

/**
 * What a file would become, before anything is saved: send it as multipart form data in the field `file`, and again as
 * JSON `{fileId, choices}` to have it read in another way. Gives Preview.
 */
export const POST: RequestHandler = async (event) => {
  const asked = askTeamJson(event, 'upload');
  if (!asked.ok) return asked.response;
  const { request, locals } = event;
  const read = (fileId: string, choices: z.infer<typeof readingChoicesSchema>) =>
    answering(() => {
      const result = previewFile(locals.db, asked.actor, fileId, choices);
      if (result.ok) return json(result.preview, { headers: { 'cache-control': 'no-store' } });
      return problem({
        status: 404,
        code: 'unknown-file',
        title: 'That file is no longer here. Choose it again.'
      });
    });
  if (!request.headers.get('content-type')?.toLowerCase().startsWith('multipart/form-data')) {
    const body = await readJson(request, again);
    return body.ok ? read(body.body.fileId, body.body.choices) : body.response;
  }
  let file: FormDataEntryValue | null;
  try {
    file = (await request.formData()).get('file');
  } catch (error) {
    return problem(bodyTrouble(error));
  }
  if (!(file instanceof File))
    return problem({ status: 422, code: 'no-file', title: 'There is no file in the field “file”.' });
  const bytes = new Uint8Array(await file.arrayBuffer());
  const { name } = file;
  return answering(() => {
    const stored = storeFile(locals.db, asked.actor, { name, bytes });
    if (stored.ok) return read(stored.file.id, {});
    if (stored.reason === 'too-large') return problem(TOO_LARGE);
    if (stored.reason === 'empty')
      return problem({ status: 422, code: 'empty', title: `${name || 'The file'} is empty.` });
    return problem({
      status: 403,
      code: 'not-allowed',
      title: 'Your role in this team does not allow that.'
    });
  });
};
