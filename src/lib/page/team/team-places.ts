import type { Role } from '$lib/model/team/roles';

/** One entry of the team's navigation; `leadOnly` ones are not shown to the others. */
export interface Place {
  path: string;
  label: string;
  leadOnly: boolean;
}

export const places: Place[] = [
  { path: 'datasets', label: 'Datasets', leadOnly: false },
  { path: 'reports', label: 'Reports', leadOnly: false },
  { path: 'devices', label: 'Devices', leadOnly: false },
  { path: 'sweeps', label: 'Sweeps', leadOnly: false },
  { path: 'sites', label: 'Site maps', leadOnly: false },
  { path: 'jobs', label: 'Jobs', leadOnly: false },
  { path: 'aside', label: 'Put aside', leadOnly: false },
  { path: 'scripts', label: 'Scripts', leadOnly: false },
  { path: 'webhooks', label: 'Webhooks', leadOnly: true },
  { path: 'members', label: 'Members', leadOnly: true },
  { path: 'events', label: 'Events', leadOnly: true },
  { path: 'settings', label: 'Settings', leadOnly: true }
];

/** What a role gets to see of the navigation. */
export function placesFor(role: Role): Place[] {
  return places.filter((place) => role === 'lead' || !place.leadOnly);
}
