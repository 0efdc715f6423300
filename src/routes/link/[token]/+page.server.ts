import { quoteOfLink } from '$lib/model/link/quote-of-link';
import type { RemarkAuthor } from '$lib/server/services/remarks/remark-author';
import { remarksOf } from '$lib/server/services/remarks/remarks-of';
import type { RequestEvent } from '@sveltejs/kit';
import { askLink } from '../../ask-link';
import { remarkAction, settleAction } from '../../remark-actions';
import type { Actions, PageServerLoad } from './$types';

/** What the link shows, and nothing else: all of it stands in the page's source. */
export const load: PageServerLoad = (event) => {
  const { view, link } = askLink(event, 'see');
  const { db, person } = event.locals;
  const viewer = person?.id ?? null;
  return {
    view,
    quote: quoteOfLink(view, event.url.origin + event.url.pathname),
    remarks: link.allowsRemarks
      ? {
          threads: remarksOf(db, { reportId: link.thingId, via: { linkId: link.id }, viewer }),
          /** How this reader's remarks are signed: null when that is for them to say. */
          as: link.hidesReferees ? 'A referee' : (person?.name ?? null)
        }
      : null
  };
};

type Event = RequestEvent<{ token: string }>;

function placeOf(event: Event, form: FormData) {
  const { link, visit } = askLink(event, 'remark');
  const reportId = link.thingId;
  const { db, person } = event.locals;
  const given = form.get('signedAs');
  const signedAs = person?.name ?? (typeof given === 'string' ? given : '');
  const author: RemarkAuthor = { kind: 'referee', linkId: link.id, personId: person?.id ?? null, signedAs };
  const address = `${event.url.origin}/team/${link.teamSlug}/reports/${reportId}`;
  const from = { linkId: link.id, reader: person?.id ?? visit ?? '' };
  return { db, author, reportId, address, from };
}

export const actions: Actions = {
  remark: async (event) => {
    askLink(event, 'remark');
    const form = await event.request.formData();
    return remarkAction(placeOf(event, form), form);
  },
  settle: async (event) => {
    askLink(event, 'remark');
    const form = await event.request.formData();
    return settleAction(placeOf(event, form), form);
  }
};
