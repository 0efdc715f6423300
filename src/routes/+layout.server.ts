import { openToAll } from './ask';
import type { LayoutServerLoad } from './$types';

/** Who is signed in, for the head of every page. */
export const load: LayoutServerLoad = ({ locals }) => {
  openToAll();
  return { person: locals.person ? { name: locals.person.name } : null };
};
