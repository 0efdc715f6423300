import { z } from 'zod';
import { unturned } from '../../unturned';
import { NAME_LENGTH, REMARK_LENGTH } from './lengths';
import { REMARK_SECTIONS } from './sections';

/** Controls but line end and tab. */
const hidden = /[^\P{Cc}\n\t]|[\u2028\u2029]/gu;

/** Without what is not seen, and marks that turn the direction of writing: they make a text read as another. */
const plain = (text: string): string => unturned(text).replace(/\r\n?/g, '\n').replace(hidden, '').trim();

/** What a remark says: plain text, line ends kept. */
export const remarkBody = z
  .string()
  .transform(plain)
  .pipe(
    z
      .string()
      .min(1, 'Write the remark first.')
      .max(
        REMARK_LENGTH,
        `A remark has at most ${REMARK_LENGTH} characters: cut it, or answer it with the rest.`
      )
  );

/** A new remark: the first of a thread about a section, or an answer in a thread. */
export const remarkInputSchema = z.object({
  section: z.enum(REMARK_SECTIONS, { error: 'Choose the section that the remark is about.' }),
  /** First remark of the thread that is answered; none for a new thread. */
  threadId: z
    .string()
    .max(40)
    .nullish()
    .transform((id) => id || null),
  body: remarkBody
});

export type RemarkInput = z.infer<typeof remarkInputSchema>;

/**
 * Whatever a name shows nothing of: controls, marks of direction, spaces without width, letters without ink. With them
 * two names that look the same would differ, and one could be turned to read as another.
 */
const unseen = /[\p{Cc}\p{Cf}\p{Cs}\p{Co}\p{Default_Ignorable_Code_Point}\u2800]/gu;

/** A name on one line, with nothing unseen in it. */
export const cleanName = (name: string): string =>
  name
    .normalize('NFC')
    .replace(/[^\S\ufeff]+/g, ' ')
    .replace(unseen, '')
    .replace(/ +/g, ' ')
    .trim();

/** Name that a stranger signs a remark with; empty for none. */
export const signatureSchema = z
  .string()
  .default('')
  .transform(cleanName)
  .pipe(z.string().max(NAME_LENGTH, `A name has at most ${NAME_LENGTH} characters.`));

/** Settling a thread, or opening it again. */
export const settleSchema = z.object({ settled: z.boolean() });
