import { formatCount, formatNumber } from '$lib/model/format-number';
import type { Diagnosis } from '$lib/stats/types';

/** How big the departure is: what each flag says of its size, and the distance from the best law. */
export function howBig({ fit, flags }: Diagnosis): string[] {
  const sizes = flags.map((flag) => flag.size).filter((size) => size !== '');
  const notice =
    fit.shotsToNotice === null
      ? ''
      : ` About ${formatCount(fit.shotsToNotice)} shots make such a distance noticeable.`;
  return [
    ...sizes,
    `The best independent-trial law lies ${formatNumber(fit.divergence, 3)} nats a shot from these counts.${notice}`
  ];
}
