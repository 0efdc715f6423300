import { problem } from './problem';

/** The answer where a stored document cannot be read; `why` completes the sentence. */
export const unreadable = (why: string, of: 'report' | 'sweep' = 'report'): Response =>
  problem({
    status: 500,
    code: 'unreadable',
    title: `The document of this ${of} cannot be read: ${why}.`,
    detail: of === 'report' ? 'Its bytes are kept: take them as JSON.' : 'Its bytes are kept by the team.'
  });
