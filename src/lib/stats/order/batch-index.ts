/** Shots sorted into batches: sizes, and which batch each shot belongs to. */
export interface BatchIndex {
  /** Batch of shot i, 0 … batches − 1 in order of first appearance. */
  of: Int32Array;
  /** Shots in each batch. */
  sizes: Float64Array;
}

/** Numbers the batches by first appearance. */
export function batchIndex(names: ArrayLike<string>): BatchIndex {
  const numbers = new Map<string, number>();
  const of = Int32Array.from(names, (name) => {
    const known = numbers.get(name) ?? numbers.size;
    numbers.set(name, known);
    return known;
  });
  const sizes = new Float64Array(numbers.size);
  for (const batch of of) sizes[batch]++;
  return { of, sizes };
}
