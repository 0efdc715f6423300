import { whatElse } from '$lib/model/report/what-else';
import type { MarginNote } from '../blocks/blocks';

/** What else the answer could come from, beside it. */
export const causesNote = (report: Parameters<typeof whatElse>[0]): MarginNote => ({
  title: 'What else it could be',
  paragraphs: whatElse(report).map(({ flag, words }) => (flag === null ? words : `${flag} ${words}`))
});
