/**
 * What two names have in common that are read as the same: letters and digits alone, without case, accents, spaces and
 * punctuation. Empty for a name without letters and digits. Letters of different scripts that look alike stay different.
 */
export const nameKey = (name: string): string =>
  name
    .normalize('NFKD')
    .toUpperCase()
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]/gu, '');
