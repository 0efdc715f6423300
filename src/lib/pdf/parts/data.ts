import { formatNumber } from '$lib/model/format-number';
import { dataFacts } from '$lib/model/report/data-facts';
import type { Block, Part } from '../blocks/blocks';
import type { Conditions, ReportInput } from '../report-input';

/** What was given: the counts, and the conditions they were taken under. */
export function dataPart({ document, provenance }: ReportInput): Part {
  const conditions = conditionFacts(provenance.conditions);
  const notes = provenance.conditions?.notes?.trim();
  const blocks: Block[] = [
    { kind: 'facts', facts: [...dataFacts(document, provenance.dataset), ...conditions] }
  ];
  if (notes)
    blocks.push(
      { kind: 'paragraph', text: 'Notes', look: 'strong' },
      ...notes
        .split(/\r?\n/)
        .filter((line) => line.trim() !== '')
        .map((text): Block => ({ kind: 'paragraph', text }))
    );
  return { title: 'What was given', rows: [{ blocks }] };
}

/** The conditions that are stated, as pairs of what and value. */
function conditionFacts(conditions: Conditions | null): [string, string][] {
  if (!conditions) return [];
  const time = (value: number | null | undefined, unit: string | null | undefined): string | null =>
    value === null || value === undefined ? null : `${formatNumber(value)}${unit ? ` ${unit}` : ''}`;
  const facts: [string, string | null | undefined][] = [
    ['Device', conditions.device],
    ['Firmware', conditions.firmware],
    ['Quench time', time(conditions.quenchTime, conditions.quenchUnit)],
    ['Hold time', time(conditions.holdTime, conditions.holdUnit)],
    ['Why this N', conditions.trialsWhy],
    ['Post-selection', conditions.postSelection],
    ['Measured on', conditions.measuredOn]
  ];
  return facts.flatMap(([what, value]) => (value ? [[what, value] as [string, string]] : []));
}
