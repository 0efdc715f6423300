import type { Diagnosis, FlagId } from '$lib/stats/types';
import { FLAGS } from '../labels';

/** A sentence with a space before it, when the report raised that flag; else ''. */
export function sayFlagged({ flags }: Pick<Diagnosis, 'flags'>, id: FlagId): string {
  const flag = flags.find((one) => one.id === id);
  return flag ? ` Flagged here: ${FLAGS[id]}, ${flag.grade === 'shown' ? 'shown' : 'hinted at'}.` : '';
}
