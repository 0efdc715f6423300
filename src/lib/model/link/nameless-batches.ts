import type { CountData } from '$lib/stats/types';

/**
 * The same counts with batches called 1, 2, 3 … in the order in which they first come: people name batches after
 * devices and each other. The engine uses names only to tell batches apart, so its document stays the same.
 */
export function namelessBatches(data: CountData): CountData {
  if (data.kind !== 'shots' || !data.batches) return data;
  const numbers = new Map<string, string>();
  const batches = data.batches.map((name) => {
    const known = numbers.get(name) ?? String(numbers.size + 1);
    numbers.set(name, known);
    return known;
  });
  return { ...data, batches };
}
