import { askByMail, showAskByMail } from '../ask-by-mail';
import { openToAll } from '../../ask';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = (event) => {
  openToAll();
  return showAskByMail(event);
};

export const actions: Actions = {
  default: (event) => {
    openToAll();
    return askByMail(event, 'password');
  }
};
