/**
 * The properties of several objects as one, each read anew whenever it is asked for: what is made live with them follows
 * what they become. Which properties there are is seen once.
 */
export function followed(...sources: (() => object)[]): Record<string, unknown> {
  const together = {};
  for (const read of sources)
    for (const key of Object.keys(read()))
      Object.defineProperty(together, key, {
        enumerable: true,
        configurable: true,
        get: () => (read() as Record<string, unknown>)[key]
      });
  return together;
}
