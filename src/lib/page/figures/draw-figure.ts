import type { ComponentProps } from 'svelte';
import { render } from 'svelte/server';
import type ReportFigure from './ReportFigure.svelte';

// Imported as a browser does, on demand: by that Kit knows that the page needs its styles although not its script.
const { default: Figure } = await import('./ReportFigure.svelte');

/** A chart as HTML, while the server draws a page. In a browser `#draw-figure` is `draw-no-figure.ts`. */
export const drawFigure = (props: ComponentProps<typeof ReportFigure>): string =>
  render(Figure, { props }).body;
