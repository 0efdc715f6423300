/**
 * Four 32-bit words of generator state from a seed and a stream number. Every input bit reaches every output bit,
 * so seeds 1, 2, 3 or streams 0, 1, 2 give unrelated states.
 *
 * The words hashed are (seed, low 32 bits of stream, high 21 bits of stream). The result equals NumPy's
 * `SeedSequence([seed, low, high]).generate_state(4)`, which the tests hold it to.
 *
 * @param seed integer 0 … 2^32 − 1
 * @param stream integer 0 … 2^53 − 1
 * @throws RangeError for anything else
 *
 * Source: O'Neill 2015, "Developing a seed_seq alternative" (published on her web log), as taken up by NumPy.
 */
export function mixSeed(seed: number, stream: number): Int32Array {
  if (!Number.isInteger(seed) || seed < 0 || seed > 0xffffffff) {
    throw new RangeError(`seed must be an integer 0 … 2^32 − 1, not ${seed}`);
  }
  if (!Number.isSafeInteger(stream) || stream < 0) {
    throw new RangeError(`stream must be an integer 0 … 2^53 − 1, not ${stream}`);
  }
  const pool = Int32Array.of(seed, stream % 4294967296, Math.floor(stream / 4294967296), 0);
  let multiplier = 0x43b0d7e5;
  const hash = (word: number): number => {
    const masked = word ^ multiplier;
    multiplier = Math.imul(multiplier, 0x931e8875);
    return fold(Math.imul(masked, multiplier));
  };
  for (let i = 0; i < 4; i++) pool[i] = hash(pool[i]);
  for (let from = 0; from < 4; from++) {
    for (let to = 0; to < 4; to++) {
      if (from === to) continue;
      const hashed = hash(pool[from]);
      pool[to] = fold(Math.imul(0xca01f9dd, pool[to]) - Math.imul(0x4973f715, hashed));
    }
  }
  multiplier = 0x8b51f9dd;
  for (let i = 0; i < 4; i++) {
    const masked = pool[i] ^ multiplier;
    multiplier = Math.imul(multiplier, 0x58f38ded);
    pool[i] = fold(Math.imul(masked, multiplier));
  }
  // The generator would stay at zero for ever from the all-zero state; odds 2^-128, but then not a hang.
  if ((pool[0] | pool[1] | pool[2] | pool[3]) === 0) pool[0] = 1;
  return pool;
}

function fold(word: number): number {
  return word ^ (word >>> 16);
}
