import { guideCases } from '$lib/server/services/guide/guide-cases';
import { writeAddress } from '$lib/page/address';
import { keepDrawn, type Drawn } from '$lib/page/guide/keep-drawn';
import { openToAll } from '../ask';
import type { PageServerLoad } from './$types';

/** What the guide draws of each dataset. */
const DRAWN: Record<string, Drawn[]> = {
  'bunched-sites': ['distribution', 'rate', 'tails'],
  'hard-core-gas': ['distribution'],
  'misread-kinks': ['distribution'],
  'forty-shots': ['distribution']
};

/** The invented data of the guide: their documents, less the points that no chart here draws. */
export const load: PageServerLoad = () => {
  openToAll();
  return {
    cases: Object.fromEntries(
      guideCases().map(({ slug, title, about, cause, diagnosis, data, options }) => [
        slug,
        {
          title,
          about,
          cause,
          diagnosis: keepDrawn(diagnosis, DRAWN[slug]),
          address: writeAddress(data, options, `${title} (invented)`)
        }
      ])
    )
  };
};
