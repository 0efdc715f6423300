import { problem } from './problem';

/** The answer where a stored document cannot be read; `why` completes the sentence. */
export const unreadable = (why: string): Response =>
  problem({
    status: 500,
    code: 'unreadable',
    title: `The document of this report cannot be read: ${why}.`,
    detail: 'Its bytes are kept: take them as JSON.'
  });
