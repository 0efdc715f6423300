import { unturned } from '$lib/model/unturned';

/**
 * Text that is safe to set: composed letters, no control signs, and none of the signs that turn the direction of
 * the text after them, which could make a report read other than it is.
 */
export const cleanText = (text: string): string =>
  unturned(text)
    .normalize('NFC')
    .replace(/\p{Cs}/gu, '\ufffd')
    .replace(/[\t\r\n\u2028\u2029]+/g, ' ')
    .replace(/[\p{Cc}\u200b-\u200f\u2060-\u206f\ufe00-\ufe0f\ufeff\u00ad]/gu, '');
