import type { Component } from 'svelte';
import { render } from 'svelte/server';
import { liveMarkup, STANDS } from './plain-markup';
import type { SpotName, SpotProps } from './spots';

// Imported as a browser does, on demand: by that Kit knows that the page needs their styles although not their scripts.
const parts: { [Name in SpotName]: Component<SpotProps[Name]> } = {
  figure: (await import('../figures/ReportFigure.svelte')).default,
  quote: (await import('../result/QuoteSection.svelte')).default,
  remarks: (await import('../remarks/Remarks.svelte')).default,
  links: (await import('../team/links/Links.svelte')).default,
  recompute: (await import('../link/Recompute.svelte')).default,
  claims: (await import('../link/Claims.svelte')).default
};

/** A live part as HTML, while the server draws a page. In a browser `#draw-spot` is `draw-nothing.ts`. */
export const drawSpot = <Name extends SpotName>(
  name: Name,
  props: SpotProps[Name],
  context: Map<unknown, unknown>
): string => {
  const drawn = render(parts[name] as Component<Record<string, unknown>>, { props, context });
  return context.has(STANDS) ? liveMarkup(drawn.body) : drawn.body;
};
