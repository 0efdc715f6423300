import type { Terms } from './term';

/** Stories whose name says less than what is fitted. */
export const STORIES = {
  'two-settings': {
    name: 'two settings',
    words: [
      'Shots of two settings pooled, half of them at p(1 − d) and half at p(1 + d): the shares are taken to be equal, and only the shift d is fitted.',
      'Where one setting had fewer shots the story fits worse than it could, and bursts or dead shots may lead in its place.'
    ],
    formula: ['f = frac{1}{2} f_{p(1−d)} + frac{1}{2} f_{p(1+d)}'],
    source: '',
    printed: true
  }
} satisfies Terms;
