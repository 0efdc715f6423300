import { z } from 'zod';
import { LONGEST_NOTES } from './device';

const version = z.coerce.number().int().min(1);
const versionId = z.string().min(1).max(64);

/** Moves a firmware version by one place in the order of its device. */
export const moveSchema = z.object({
  version,
  versionId,
  by: z.enum(['-1', '1']).transform((by) => (by === '1' ? 1 : -1))
});

/** Notes on a device, or on the version named; empty ones are none. */
export const notesSchema = z.object({
  version,
  versionId: versionId.or(z.literal('')).transform((id) => id || null),
  notes: z
    .string()
    .max(LONGEST_NOTES, `Notes have at most ${LONGEST_NOTES} characters.`)
    .transform((notes) => notes.replaceAll('\r\n', '\n').trim() || null)
});
