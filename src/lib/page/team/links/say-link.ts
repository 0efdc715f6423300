import type { LinkOptions } from '$lib/model/link/link-options';
import { sayUntil } from '$lib/model/say-until';

type Said = Pick<
  LinkOptions,
  'audience' | 'people' | 'shows' | 'blind' | 'hidesReferees' | 'allowsRemarks' | 'expiresAt' | 'visitLimit'
>;

/** What a link does, a sentence a line: who may open it, what it shows, and until when. */
export function sayLink(link: Said, opens: 'report' | 'sweep' = 'report'): string[] {
  const who = {
    anyone: 'Opens for anyone who has the address.',
    named: `Opens for ${link.people.join(', ')}, who sign in with that address.`,
    team: 'Opens for members of the team.'
  }[link.audience];
  const shows =
    opens === 'sweep'
      ? 'Shows the sweep: times, shots, cumulants and answers of its datasets, from which counts can be told where they are few.'
      : link.shows === 'report'
        ? 'Shows the report without its counts: whoever guesses them can check the guess, but not recompute the report.'
        : 'Shows the report and its counts, so it can be recomputed.';
  return [
    who,
    `${shows} ${link.blind ? `Hides team, people, device, firmware and group${opens === 'sweep' ? ', and the names of the datasets' : ''}.` : 'Names the team, the device and who made it.'}`,
    link.allowsRemarks
      ? `Takes remarks${link.hidesReferees ? ', signed “A referee”' : ''}.`
      : `Takes no remarks${link.hidesReferees ? ', and names nobody who opened it' : ''}.`,
    `${link.expiresAt === null ? 'Stays open until you close it' : `Open ${sayUntil(link.expiresAt)}`}${
      link.visitLimit === null
        ? ''
        : `, or after ${link.visitLimit} ${link.visitLimit === 1 ? 'visit' : 'visits'}`
    }.`
  ];
}
