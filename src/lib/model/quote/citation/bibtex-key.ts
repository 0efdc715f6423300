import type { Provenance } from '../provenance';

/**
 * Key of an entry, letters and digits alone: the program, the year where it is told, and eight digits of what tells
 * this report from others: the sha256 of its document, else of its counts, else the end of its address.
 */
export function bibtexKey({ madeAt, sha256, url }: Provenance, digest: string | null): string {
  const year = madeAt === null ? '' : new Date(madeAt).getUTCFullYear();
  const own = sha256 ?? digest?.replace(/^sha256:/, '') ?? '';
  const part = own.slice(0, 8) || (url ?? '').replace(/[^A-Za-z0-9]/g, '').slice(-8);
  return `severalty${year}x${part}`.replace(/[^A-Za-z0-9]/g, '');
}
