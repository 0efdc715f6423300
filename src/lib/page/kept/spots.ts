import type { ComponentProps } from 'svelte';
import { figureMaker } from '../figures/figure-maker';
import type ReportFigure from '../figures/ReportFigure.svelte';
import type Claims from '../link/Claims.svelte';
import type Recompute from '../link/Recompute.svelte';
import type Remarks from '../remarks/Remarks.svelte';
import type QuoteSection from '../result/QuoteSection.svelte';
import type Links from '../team/links/Links.svelte';
import type { Maker } from './waken';

/** What each live part of a report is given. */
export interface SpotProps {
  figure: ComponentProps<typeof ReportFigure>;
  quote: ComponentProps<typeof QuoteSection>;
  remarks: ComponentProps<typeof Remarks>;
  links: ComponentProps<typeof Links>;
  recompute: ComponentProps<typeof Recompute>;
  claims: ComponentProps<typeof Claims>;
}

export type SpotName = keyof SpotProps;

/** A part whose script is loaded when it is wanted. */
const onDemand = <Props extends Record<string, unknown>>(load: Maker<Props>['load']): Maker<Props> => ({
  atHand: () => null,
  load
});

/** What makes each of them live in a browser. */
export const SPOTS: { [Name in SpotName]: Maker<SpotProps[Name]> } = {
  figure: figureMaker,
  quote: onDemand(async () => (await import('../result/QuoteSection.svelte')).default),
  // One beside each part, and most are never touched.
  remarks: {
    ...onDemand(async () => (await import('../remarks/Remarks.svelte')).default),
    stands: () => true
  },
  links: onDemand(async () => (await import('../team/links/Links.svelte')).default),
  recompute: onDemand(async () => (await import('../link/Recompute.svelte')).default),
  claims: onDemand(async () => (await import('../link/Claims.svelte')).default)
};
