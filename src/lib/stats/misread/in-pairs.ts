import type { Window } from '../laws/window';
import type { Unit } from '../types';

/** A law of even counts as one of pairs, where these are told. */
export function inPairs({ first, values, scale }: Window, unit: Unit): Window {
  if (unit === 'defect') return { first, values, scale };
  return { first: first / 2, values: values.filter((_, i) => (first + i) % 2 === 0), scale };
}
