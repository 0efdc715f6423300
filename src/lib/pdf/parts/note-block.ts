import type { Block } from '../blocks/blocks';

/** A remark under a table, in small faint letters; nothing for ''. */
export const noteBlock = (text: string): Block[] =>
  text === '' ? [] : [{ kind: 'paragraph', text, look: 'smallFaint' }];
