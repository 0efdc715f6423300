import { MAP_FIELDS, readMapForm, type TypedMap } from '$lib/model/team/site-maps/site-map-form';
import { saveSiteMap, type SavedSiteMap } from '$lib/server/services/site-maps/save-site-map';
import { fail, redirect } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import { acting, bodyTrouble } from '../../datasets/answers';
import { filesOfForm } from '../../datasets/new/files-of-form';
import type { Actions, PageServerLoad } from './$types';

/** Longest pasted text that a refused form brings back without scripts; with them nothing leaves its field. */
const KEPT_PASTE = 200_000;

export const load: PageServerLoad = (event) => {
  askTeam(event, 'upload');
};

const WORDS = {
  'not-allowed': { status: 403, message: 'Your role in this team does not allow that.' },
  'too-large': { status: 413, message: 'Site-resolved shots take 4 MB at most. Give a part of the shots.' },
  empty: { status: 422, message: 'The file is empty.' },
  unreadable: { status: 422, message: '' },
  'already-there': { status: 409, message: 'This file is mapped in this way already: nothing was saved.' }
} as const;

function refusal(refused: Extract<SavedSiteMap, { ok: false }>, fileName: string) {
  const { status, message } = WORDS[refused.reason];
  const unreadable =
    refused.reason === 'unreadable'
      ? { name: fileName, problems: refused.problems, more: refused.more }
      : null;
  return { status, message, unreadable, already: refused.reason === 'already-there' ? refused.already : [] };
}

export const actions: Actions = {
  default: async (event) => {
    const { team, actor } = askTeam(event, 'upload');
    let data: FormData;
    try {
      data = await event.request.formData();
    } catch (error) {
      const { status, title } = bodyTrouble(error);
      return fail(status, { message: title });
    }
    const typed = Object.fromEntries(
      MAP_FIELDS.map((field) => [field, String(data.get(field) ?? '')])
    ) as TypedMap;
    const pasted = String(data.get('pasted') ?? '');
    const kept = { typed, pasted: pasted.length > KEPT_PASTE ? '' : pasted };
    const files = await filesOfForm(data);
    const read = readMapForm(typed);
    if (!read.ok)
      return fail(400, {
        ...kept,
        problems: read.problems,
        message: 'Some of that does not fit: it is marked.'
      });
    if (files.length === 0)
      return fail(400, { ...kept, message: 'Choose a file of site-resolved shots, or paste some.' });
    if (files.length > 1)
      return fail(400, {
        ...kept,
        message: 'Choose one file, or paste shots: not both, since a map is of one file.'
      });
    const [{ name: fileName, bytes }] = files;
    const { name, geometry, seek, alpha, ...more } = read.fields;
    return acting(kept, () => {
      const saved = saveSiteMap(event.locals.db, actor, {
        ...more,
        fileName,
        bytes,
        name: name ?? (fileName.replace(/\.[a-z]{1,4}$/i, '').slice(0, 180) || 'Sites'),
        options: { geometry, seek, alpha }
      });
      if (saved.ok) redirect(303, `/team/${team.slug}/sites/${saved.id}`);
      const { status, ...said } = refusal(saved, fileName);
      return fail(status, { ...kept, ...said });
    });
  }
};
