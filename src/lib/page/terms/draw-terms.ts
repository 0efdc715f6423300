import type { TermId } from '$lib/model/terms/terms';
import { render } from 'svelte/server';
import TermsBody from './TermsBody.svelte';

/** The terms of a part as HTML, while the server draws a page. In a browser `#draw-terms` is `draw-no-terms.ts`. */
export const drawTerms = (props: { of: readonly TermId[]; guide?: string; apart: boolean }): string =>
  render(TermsBody, { props: { ...props, folded: true } }).body;
