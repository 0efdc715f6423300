import { createContext, type Snippet } from 'svelte';

const [get, set, has] = createContext<Snippet<[string]>>();

/**
 * Puts something at the end of every part of the result below, such as the remarks on it; the snippet is given the
 * part's id (`answer`, `data`, `counts-and-law` …). Call it while the component is made.
 */
export const setBeside = (snippet: Snippet<[string]>) => set(snippet);

/** What setBeside put there, or null. */
export const getBeside = (): Snippet<[string]> | null => (has() ? get() : null);
