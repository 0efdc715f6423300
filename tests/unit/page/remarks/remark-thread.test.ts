import type { RemarkView, ThreadView } from '$lib/model/team/remarks/threads';
import RemarkThread from '$lib/page/remarks/RemarkThread.svelte';
import { render } from 'svelte/server';
import { describe, expect, it } from 'vitest';

const remark = (more: Partial<RemarkView>): RemarkView => ({
  id: more.by ?? 'x',
  body: 'words',
  by: 'Ada Invented',
  from: 'team',
  typed: false,
  mine: false,
  createdAt: 86_400_000 * 3 + 3_600_000 * 5,
  ...more
});

const remarks = [
  remark({ by: 'The team.', from: 'link', typed: true }),
  remark({ by: 'Ruth', from: 'link' }),
  remark({ by: 'The team' })
];

/** What each remark says of its author, without tags. */
function shown(link: ThreadView['link']): string[] {
  const thread: ThreadView = { id: 't', section: 'law', remarks, settled: null, link };
  const { body } = render(RemarkThread, { props: { thread, form: null, mayRemark: false } });
  const html = body.replace(/<!--[^]*?-->/g, '');
  const lines = [...html.matchAll(/<p class="by[^"]*">([^]*?)<\/p>/g)].map(([, line]) => line);
  return lines.map((line) =>
    line
      .replace(/<span class="team[^"]*">team<\/span>/, '[stamp]')
      .replace(/<[^>]*>/g, ' ')
      .replace(/(\s|&nbsp;|\u00a0)+/g, ' ')
      .trim()
  );
}

describe('RemarkThread', () => {
  it('says on the page of a link what comes from its readers, and stamps what is the team’s', () => {
    expect(shown(null)).toEqual([
      'The team. typed by a reader of this link 4 Jan 1970, 05:00 UTC',
      'Ruth a reader of this link 4 Jan 1970, 05:00 UTC',
      'The team [stamp] 4 Jan 1970, 05:00 UTC'
    ]);
  });

  it('names the link to the team, and the day alone where it hides referees', () => {
    expect(shown({ label: 'round 2', blind: false, hidesReferees: true })).toEqual([
      'The team. name as typed, by link “round 2” 4 Jan 1970',
      'Ruth by link “round 2” 4 Jan 1970',
      'The team [stamp] 4 Jan 1970, 05:00 UTC'
    ]);
  });
});
