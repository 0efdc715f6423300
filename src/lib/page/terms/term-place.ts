import { createContext } from 'svelte';

interface TermPlace {
  /** Address in front of `#term-…`: empty on a page that has the notes of its own terms. */
  readonly before: string;
  /** The page would lose what it holds when it is left: links open beside it. */
  readonly apart: boolean;
  /** The notes stand on this page. */
  readonly here: boolean;
}

const [get, set, has] = createContext<TermPlace>();

/** The page of all terms, where links lead from pages without notes. */
const ALL: TermPlace = { before: '/guide/terms', apart: false, here: false };

/** Says, while a component is made, where the notes of the terms below it stand. */
export const setTermPlace = (place: TermPlace): void => void set(place);

/** What setTermPlace said, or the page of all terms. */
export const getTermPlace = (): TermPlace => (has() ? get() : ALL);
