import { sayNuisances } from '$lib/model/report/say-nuisances';
import type { Part } from '../blocks/blocks';
import type { ReportInput } from '../report-input';

/** What can mimic interaction, and what is known of it here. */
export const nuisancesPart = ({ document, provenance }: ReportInput): Part => ({
  title: 'What can look like interaction',
  rows: [{ blocks: [{ kind: 'facts', facts: sayNuisances(document, provenance.conditions) }] }]
});
