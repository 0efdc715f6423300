import type { Component } from 'svelte';
import { render } from 'svelte/server';
import { plainMarkup, STANDS } from './plain-markup';
import type { StillName, StillProps } from './stills';

// As in draw-spot.ts: Kit sends styles along for what a page may import later.
const pages: { [Name in StillName]: Component<StillProps[Name]> } = {
  team: (await import('../team/reports/TeamReport.svelte')).default,
  shared: (await import('../link/SharedReport.svelte')).default
};

/** A page as HTML, while the server draws it. In a browser `#draw-still` is `draw-nothing.ts`. */
export const drawStill = <Name extends StillName>(
  name: Name,
  props: StillProps[Name],
  context: Map<unknown, unknown>
): string => {
  const within = new Map(context).set(STANDS, true);
  const drawn = render(pages[name] as Component<Record<string, unknown>>, { props, context: within });
  return plainMarkup(drawn.body);
};
