import type { Diagnosis } from '$lib/stats/types';

/** Why lumped counts have no third and fourth cumulant, after a blank; '' where the document tells them. */
export const sayUnknownCumulants = ({
  data,
  moments
}: {
  data: Pick<Diagnosis['data'], 'lump' | 'below'>;
  moments: Pick<Diagnosis['moments'], 'third'>;
}): string =>
  (data.lump || data.below) && moments.third.value === null
    ? ' κ₃ and κ₄ are not known: they hang most on the counts far from the mean, which the lumped rows hide.'
    : '';
