import { moveSchema, notesSchema } from '$lib/model/team/devices/device-form';
import { gateRuleSchema, sayNoGroups } from '$lib/model/team/devices/gate';
import { deviceMatrix } from '$lib/server/services/devices/device-matrix';
import { moveVersion } from '$lib/server/services/devices/move-version';
import { noteDevice } from '$lib/server/services/devices/note-device';
import { readDevice } from '$lib/server/services/devices/read-device';
import { removeVersion } from '$lib/server/services/devices/remove-version';
import { readRule } from '$lib/server/services/gates/read-rule';
import { setRule } from '$lib/server/services/gates/set-rule';
import { error, fail } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import type { Actions, PageServerLoad } from './$types';
import { DEVICE_REFUSALS, NO_DEVICE, UNREADABLE_FORM } from './words';

export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const read = readDevice(event.locals.db, actor, event.params.id);
  const drawn = deviceMatrix(event.locals.db, actor, event.params.id);
  if (!read.ok || !drawn.ok) error(404, NO_DEVICE);
  const rule = readRule(event.locals.db, actor, event.params.id);
  return { device: read.device, matrix: drawn.matrix, rule };
};

const fieldsOf = async (request: Request) => Object.fromEntries(await request.formData());

export const actions: Actions = {
  move: async (event) => {
    const { actor } = askTeam(event, 'edit');
    const asked = moveSchema.safeParse(await fieldsOf(event.request));
    if (!asked.success) return fail(400, { problem: UNREADABLE_FORM });
    const done = moveVersion(event.locals.db, actor, event.params.id, asked.data);
    if (done.ok) return { told: `“${done.name}” is moved.` };
    if (done.reason === 'unknown') error(404, NO_DEVICE);
    return fail(409, { problem: DEVICE_REFUSALS[done.reason] });
  },
  notes: async (event) => {
    const { actor } = askTeam(event, 'edit');
    const fields = await fieldsOf(event.request);
    const asked = notesSchema.safeParse(fields);
    const typed = { versionId: String(fields.versionId ?? ''), notes: String(fields.notes ?? '') };
    if (!asked.success) return fail(400, { problem: asked.error.issues[0].message, typed });
    const done = noteDevice(event.locals.db, actor, event.params.id, asked.data);
    if (done.ok) return { told: 'The notes are saved.' };
    if (done.reason === 'unknown') error(404, NO_DEVICE);
    return fail(409, { problem: DEVICE_REFUSALS.stale, typed });
  },
  rule: async (event) => {
    const { actor } = askTeam(event, 'edit');
    const fields = await fieldsOf(event.request);
    const asked = gateRuleSchema.safeParse(fields);
    const typedRule = Object.fromEntries(
      Object.entries(fields).map(([name, value]) => [name, String(value)])
    );
    if (!asked.success) return fail(400, { problem: asked.error.issues[0].message, typedRule });
    const done = setRule(event.locals.db, actor, event.params.id, asked.data);
    if (done.ok) return { told: 'The rule is set. Each version’s page says how it stands by it.' };
    if (done.reason === 'unknown') error(404, NO_DEVICE);
    if (done.reason === 'no-group') return fail(400, { problem: sayNoGroups(done.groups), typedRule });
    return fail(done.reason === 'stale' ? 409 : 400, { problem: DEVICE_REFUSALS[done.reason], typedRule });
  },
  remove: async (event) => {
    const { actor } = askTeam(event, 'edit');
    const versionId = String((await event.request.formData()).get('versionId'));
    const done = removeVersion(event.locals.db, actor, event.params.id, versionId);
    if (done.ok) return { told: `“${done.name}” is removed.` };
    if (done.reason === 'unknown') error(404, NO_DEVICE);
    return fail(409, { problem: DEVICE_REFUSALS.named });
  }
};
