/**
 * Exponent of the defect number with quench time, dν/(1 + zν), for a transition crossed linearly and defects that are
 * points in d dimensions.
 *
 * @param dimension d > 0
 * @param correlation ν > 0, exponent of the correlation length
 * @param dynamic z > 0, dynamic exponent
 * @throws RangeError for anything else
 *
 * Source: Kibble 1976, J. Phys. A 9:1387; Zurek 1985, Nature 317:505.
 */
export function quenchExponent(dimension: number, correlation: number, dynamic: number): number {
  for (const value of [dimension, correlation, dynamic])
    if (!(value > 0 && value < Infinity)) throw new RangeError(`not a positive number: ${value}`);
  return (dimension * correlation) / (1 + dynamic * correlation);
}
