import type { Component, ComponentProps } from 'svelte';
import type SharedReport from '../link/SharedReport.svelte';
import type TeamReport from '../team/reports/TeamReport.svelte';

/** What each page that the server draws whole is made from. */
export interface StillProps {
  team: ComponentProps<typeof TeamReport>;
  shared: ComponentProps<typeof SharedReport>;
}

export type StillName = keyof StillProps;

/** For a reader who comes from another page of the application, whose browser draws this one itself. */
export const STILLS: { [Name in StillName]: () => Promise<Component<StillProps[Name]>> } = {
  team: async () => (await import('../team/reports/TeamReport.svelte')).default,
  shared: async () => (await import('../link/SharedReport.svelte')).default
};
