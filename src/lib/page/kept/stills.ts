import type { Component, ComponentProps } from 'svelte';
import type { Maker } from './waken';
import type SharedReport from '../link/SharedReport.svelte';
import type TeamReport from '../team/reports/TeamReport.svelte';

/** What each page that the server draws whole is made from. */
export interface StillProps {
  team: ComponentProps<typeof TeamReport>;
  shared: ComponentProps<typeof SharedReport>;
}

export type StillName = keyof StillProps;

/** Which of them this browser has, since its reader comes to one from another page. */
const known: { [Name in StillName]?: Component<StillProps[Name]> } = {};

const LOAD: { [Name in StillName]: () => Promise<Component<StillProps[Name]>> } = {
  team: async () => (known.team = (await import('../team/reports/TeamReport.svelte')).default),
  shared: async () => (known.shared = (await import('../link/SharedReport.svelte')).default)
};

/** For a reader who comes from another page of the application, whose browser draws this one itself. */
export const stillMaker = <Name extends StillName>(name: Name): Maker<StillProps[Name]> => ({
  atHand: () => known[name] ?? null,
  load: LOAD[name]
});

/**
 * Has what draws a page at hand before it is gone to: drawn later, it would come too late for the place in it that its
 * reader left or asked for. Nothing is loaded for a page that the server drew.
 */
export async function haveStill(name: StillName): Promise<void> {
  if (typeof document !== 'undefined' && !document.querySelector('.still.rolled')) await LOAD[name]();
}
