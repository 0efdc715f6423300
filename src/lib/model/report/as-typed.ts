import { unturned } from '$lib/model/unturned';

/**
 * What a person typed, to stand within a sentence of the report: between quotation marks and on its own, so that words
 * written from right to left turn nothing outside of them. Signs that would turn more are taken out.
 */
export const asTyped = (text: string): string => `“\u2068${unturned(text).trim()}\u2069”`;

/** The same where the sentence ends with it: no second stop after one that was typed. */
export function endAsTyped(text: string): string {
  const quoted = asTyped(text);
  return /[.!?…。！？؟।]["'”’»)\]]*\u2069”$/u.test(quoted) ? quoted : `${quoted}.`;
}
