import type { Role } from '$lib/model/team/roles';

/** Team that a first start in local mode comes with; all of it is invented. */
export const DEMO_TEAM = { name: 'Wrackline Bay chain laboratory (invented)', slug: 'wrackline-bay' };

/** Good on a loopback address alone, where it is printed at every start. */
export const DEMO_PASSWORD = 'dulse wrack marram kelp';

export const DEMO_PEOPLE: { email: string; name: string; role: Role }[] = [
  { email: 'tove@wrackline.example', name: 'Tove Marrable', role: 'lead' },
  { email: 'iven@wrackline.example', name: 'Iven Sandgate', role: 'experimenter' },
  { email: 'runa@wrackline.example', name: 'Runa Halse', role: 'observer' }
];
