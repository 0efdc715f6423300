import { standsAsDrawn } from '$lib/charts/first-size';
import { endFirstReading } from '$lib/charts/reading/end-first-reading';
import type { Component, ComponentProps } from 'svelte';
import type { Maker } from '../kept/waken';
import type ReportFigure from './ReportFigure.svelte';

type Props = ComponentProps<typeof ReportFigure>;

let known: Component<Props> | null = null;

/** For a page that has charts in its own script, so that it draws them without waiting. */
export const haveFigures = (figure: Component<Props>): void => void (known = figure);

/** Makes the charts of reports live. */
export const figureMaker: Maker<Props> = {
  atHand: () => known,
  stands: standsAsDrawn,
  restore: endFirstReading,
  load: async () => (known ??= (await import('./ReportFigure.svelte')).default)
};
