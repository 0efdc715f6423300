import type { Actor } from '$lib/server/services/access/actor';
import { previewFile } from '$lib/server/services/datasets/preview-file';
import { storeFile } from '$lib/server/services/datasets/store-file';
import type { GivenFile } from './files-of-form';
import { choicesOfForm } from './choices-of-form';

type Database = App.Locals['db'];
type PreviewRead = Extract<ReturnType<typeof previewFile>, { ok: true }>['preview'];

const WORDS = {
  'not-allowed': 'cannot be taken: your role does not allow it.',
  'too-large': 'is larger than 20 MB, which is the limit.',
  empty: 'is empty.'
};

/** What the files of a form would become: those it names, read as it says now, and those that are new. */
export function previewsOfForm(
  db: Database,
  actor: Actor,
  data: FormData,
  files: GivenFile[]
): { previews: PreviewRead[]; message: string } {
  const refused: string[] = [];
  const ids = data.getAll('file').map(String);
  for (const file of files) {
    const stored = storeFile(db, actor, file);
    if (stored.ok) ids.push(stored.file.id);
    else refused.push(`${file.name} ${WORDS[stored.reason]}`);
  }
  const previews = [...new Set(ids)].flatMap((id): PreviewRead[] => {
    const read = previewFile(db, actor, id, choicesOfForm(data, `${id}.`));
    return read.ok ? [read.preview] : [];
  });
  if (ids.length === 0 && refused.length === 0) refused.push('Choose a file, or paste some counts.');
  return { previews, message: refused.join(' ') };
}
