import { quenchExponent } from '$lib/stats/sweep/quench-exponent';
import { UNIVERSALITY_CLASSES } from '$lib/stats/sweep/universality-classes';

/** The table of published transitions, which lives with the engine, each with the exponent that it leads to. */
export const TRANSITIONS = UNIVERSALITY_CLASSES.map((one) => ({
  ...one,
  exponent: quenchExponent(one.dimension, one.correlation, one.dynamic)
}));
