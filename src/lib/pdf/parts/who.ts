import type { Provenance } from '../report-input';
import { sayWhen } from './say-when';

/** Who made a report and when; nothing for a blind one. */
export function whoFacts({ madeBy, team, madeAt }: Provenance): [string, string][] {
  const who: [string, string | null][] = [
    ['Made by', madeBy],
    ['Team', team],
    ['Made', madeAt === null ? null : sayWhen(madeAt)]
  ];
  return who.flatMap(([what, value]) => (value ? [[what, value] as [string, string]] : []));
}
