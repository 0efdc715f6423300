/** A printed number and its standard error. */
export interface Measured {
  value: number;
  /** One standard deviation, > 0. */
  error: number;
  /** No error was printed: `error` is half a unit of the last digit, which is what rounding leaves open. */
  rounded?: true;
}

/** A line of a published table: cumulants of counts in defects to their power, with no histogram. */
export interface PublishedCumulants {
  /** N, or null when unknown or unbounded. */
  trials: number | null;
  mean: Measured;
  variance: Measured;
  third: Measured | null;
  /** Only together with the third. */
  fourth: Measured | null;
}

/** The numbers given, κ1 first: two to four of them. */
export function givenCumulants({ mean, variance, third, fourth }: PublishedCumulants): Measured[] {
  const given = [mean, variance];
  if (third) given.push(third);
  if (third && fourth) given.push(fourth);
  return given;
}
