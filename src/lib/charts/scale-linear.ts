import { roundValues } from './round-values';

/** A place on an axis for each value, and round values to mark. */
export interface LinearScale {
  (value: number): number;
  /** About `count` round values within the domain, in its order. */
  ticks(count: number): number[];
  range(): [number, number];
}

/**
 * Straight scale from a domain to picture units. Written out here, since the general package brings colours, dates and
 * number formats along: 8 kB of every report page.
 *
 * @param domain two values; where they are equal every value lies in the middle
 */
export function scaleLinear([from, to]: [number, number], [start, end]: [number, number]): LinearScale {
  const width = to - from;
  const place = (value: number): number => {
    const share = width ? (value - from) / width : 0.5;
    return start * (1 - share) + end * share;
  };
  return Object.assign(place, {
    ticks: (count: number) => roundValues(from, to, count),
    range: (): [number, number] => [start, end]
  });
}
