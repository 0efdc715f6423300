import type { ExplanationId } from './types';

/** What each explanation is called, within a sentence. */
export const explanationNames: Record<ExplanationId, string> = {
  'equal-trials': 'equal independent trials',
  'best-independent': 'the best independent trials',
  'common-cause': 'a common cause',
  neighbours: 'neighbour coupling',
  'two-settings': 'two settings',
  bursts: 'bursts',
  'dead-shots': 'dead shots',
  'pair-loss': 'loss in pairs',
  'misread-sites': 'misread sites'
};
