import type { RemarkView, ThreadView } from '$lib/model/team/remarks/threads';

/**
 * Where a remark that came by a link is from. Stands beside its name, so that no name can pass for the team's.
 *
 * @param link the thread's link for the team; null on the page of the link itself
 */
export function saySource({ typed }: Pick<RemarkView, 'typed'>, link: ThreadView['link']): string {
  if (link === null) return typed ? 'typed by a reader of this link' : 'a reader of this link';
  return `${typed ? 'name as typed, ' : ''}by link “${link.label}”`;
}
