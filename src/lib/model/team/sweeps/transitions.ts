// Pages take the table of published transitions from here: it lives with the engine, whose documents name its exponents.
export { UNIVERSALITY_CLASSES as TRANSITIONS } from '$lib/stats/sweep/universality-classes';
