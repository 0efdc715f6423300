import type { Diagnosis } from '$lib/stats/types';
import { formatCount } from '../format-number';
import { sayInterval } from '../say-interval';

/** What each flag says of its size. */
export const flagSizes = ({ flags }: Pick<Diagnosis, 'flags'>): string[] =>
  flags.map((flag) => flag.size).filter((size) => size !== '');

/** How big the departure is: what each flag says of its size, and the distance from the best law. */
export function howBig({ fit, flags }: Pick<Diagnosis, 'fit' | 'flags'>): string[] {
  const notice =
    fit.shotsToNotice === null
      ? ''
      : ` About ${formatCount(fit.shotsToNotice)} ${fit.shotsToNotice === 1 ? 'shot makes' : 'shots make'} such a distance noticeable.`;
  const distance = { ...fit.divergenceInterval, value: fit.divergenceInterval.value ?? fit.divergence };
  return [
    ...flagSizes({ flags }),
    `The best independent-trial law lies ${sayInterval(distance, 2)} nats a shot from these counts, chance taken off.${notice}`
  ];
}
