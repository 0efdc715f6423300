import { unturned } from './unturned';

/**
 * A file's name as a page shows it: without control signs and without those that turn the direction of writing, by which
 * "gnp.csv" is shown as another file's name. Letters of any script stay, and so does what joins the parts of a sign.
 */
export const shownName = (name: string): string =>
  unturned(name)
    .replace(/[\p{Cc}\u200e\u200f\u061c]/gu, '')
    .trim() || 'file without a name';
