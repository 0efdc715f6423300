import type { Diagnosis } from '$lib/stats/types';
import { olderDocument } from '../older-document';
import type { SharedContent } from './shown-by-link';
import type { Summary } from './summary';

/** The whole document that a link shows, or what is left of it without its counts. */
export type ShownReport = { whole: true; diagnosis: Diagnosis } | { whole: false; summary: Summary };

export const shownReport = (content: SharedContent): ShownReport =>
  content.kind === 'whole'
    ? { whole: true, diagnosis: olderDocument(JSON.parse(content.document)) as Diagnosis }
    : { whole: false, summary: content.summary };
