import type { PublishedCumulants } from './published-cumulants';
import { withErrors } from './with-errors';

/** Which cumulants were not judged, since they have no error beside those that have; empty where all were. */
export function sayLeftOut(printed: PublishedCumulants): string {
  const judged = withErrors(printed);
  const third = printed.third !== null && judged.third === null;
  const fourth = printed.fourth !== null && judged.fourth === null;
  if (!third && !fourth) return '';
  const given = third ? 'third' : 'fourth';
  const also = third && fourth ? ', and with it the fourth' : '';
  return ` No error was given for the ${given} cumulant: it is left out${also}, since how far shots scatter is known of the others only.`;
}
