import { sayTime } from '$lib/model/report/say-time';
import type { Block } from '../blocks/blocks';
import type { Conditions } from '../report-input';

/** The conditions that are stated, as pairs of what and value. */
export function conditionFacts(conditions: Conditions | null): [string, string][] {
  if (!conditions) return [];
  const facts: [string, string | null | undefined][] = [
    ['Device', conditions.device],
    ['Firmware', conditions.firmware],
    ['Group', conditions.group],
    ['Quench time', sayTime(conditions.quenchTime, conditions.quenchUnit)],
    ['Hold time', sayTime(conditions.holdTime, conditions.holdUnit)],
    ['Why this N', conditions.trialsWhy],
    ['Post-selection', conditions.postSelection],
    ['Measured on', conditions.measuredOn]
  ];
  return facts.flatMap(([what, value]) => (value ? [[what, value] as [string, string]] : []));
}

/** What people noted, one paragraph a line. */
export function notesBlocks(conditions: Conditions | null): Block[] {
  const notes = conditions?.notes?.trim();
  if (!notes) return [];
  return [
    { kind: 'paragraph', text: 'Notes', look: 'strong' },
    ...notes
      .split(/\r?\n/)
      .filter((line) => line.trim() !== '')
      .map((text): Block => ({ kind: 'paragraph', text }))
  ];
}
