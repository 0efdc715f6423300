/** One element of MathML: what it is called, and its text or its children. */
export type MathNode =
  { tag: 'mi' | 'mn' | 'mo' | 'mtext'; text: string } | { tag: MathBox; children: MathNode[] };

/** Elements that hold others; all but `mrow` and `msqrt` need an exact number of them. */
export type MathBox =
  'mrow' | 'msqrt' | 'mfrac' | 'msub' | 'msup' | 'msubsup' | 'munder' | 'mover' | 'munderover';

/** How many children MathML Core asks of an element; null where any number will do. */
export const CHILDREN: Record<MathBox, number | null> = {
  mrow: null,
  msqrt: null,
  mfrac: 2,
  msub: 2,
  msup: 2,
  msubsup: 3,
  munder: 2,
  mover: 2,
  munderover: 3
};
