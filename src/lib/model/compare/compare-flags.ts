import { FLAGS } from '$lib/model/labels';
import type { Diagnosis, FlagId } from '$lib/stats/types';
import { compareLines } from './compare-lines';
import type { ComparedPart } from './compared';

/** How sure each flag is, for the flags raised in one result or in both. */
export function compareFlags(first: Diagnosis, second: Diagnosis): ComparedPart {
  const grade = ({ flags }: Diagnosis, id: FlagId): string => {
    const flag = flags.find((one) => one.id === id);
    return flag ? (flag.grade === 'shown' ? 'shown' : 'hinted at') : 'not raised';
  };
  const ids = (Object.keys(FLAGS) as FlagId[]).filter((id) =>
    [...first.flags, ...second.flags].some((flag) => flag.id === id)
  );
  return compareLines(
    'flags',
    'What the counts point to',
    ids.map((id) => [FLAGS[id], grade(first, id), grade(second, id)])
  );
}
