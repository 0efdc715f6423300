import { mixSeed } from './mix-seed';

/** A stream of random numbers. */
export interface Generator {
  /** Uniform on (0, 1): the midpoints of 2^52 equal cells, so never 0 or 1 and symmetric about ½. */
  next(): number;
  /** Uniform integer 0 … 2^32 − 1. */
  uint32(): number;
}

/**
 * Seeded stream of random numbers: xoshiro128** 1.1 on 32-bit integers, period 2^128 − 1, with a state mixed
 * from (seed, stream) so that neighbouring seeds and streams share nothing. Integer operations alone, hence the
 * same numbers in every engine. Split work over threads by giving resample b of test k the stream k·2^20 + b.
 *
 * A double takes two 32-bit draws and keeps 52 bits: 53 would put the topmost midpoint at exactly 1.
 *
 * @param seed integer 0 … 2^32 − 1
 * @param stream integer 0 … 2^53 − 1
 * @throws RangeError for anything else
 *
 * Source: Blackman & Vigna 2021, ACM Trans. Math. Softw. 47:36. Passes every test its authors know of. Streams
 * start at random places of the one cycle: among 2^20 streams of 2^30 draws two overlap with odds under 2^-57.
 */
export function generator(seed: number, stream: number): Generator {
  return new Xoshiro128(mixSeed(seed, stream));
}

class Xoshiro128 implements Generator {
  // A typed array, since int32 values kept in plain fields are boxed once they leave the small-integer range.
  constructor(private readonly state: Int32Array) {}

  uint32(): number {
    const state = this.state;
    const b = state[1];
    const result = scramble(b);
    const c = state[2] ^ state[0];
    const d = state[3] ^ b;
    state[0] ^= d;
    state[1] = b ^ c;
    state[2] = c ^ (b << 9);
    state[3] = (d << 11) | (d >>> 21);
    return result >>> 0;
  }

  /** Two steps written out: half the time of two calls of uint32, which store and reload the state between. */
  next(): number {
    const state = this.state;
    let a = state[0];
    let b = state[1];
    let c = state[2] ^ a;
    let d = state[3] ^ b;
    const high = scramble(b) >>> 6;
    a ^= d;
    let shifted = b << 9;
    b ^= c;
    c ^= shifted;
    d = (d << 11) | (d >>> 21);

    const low = scramble(b) >>> 6;
    c ^= a;
    d ^= b;
    a ^= d;
    shifted = b << 9;
    b ^= c;
    c ^= shifted;
    d = (d << 11) | (d >>> 21);

    state[0] = a;
    state[1] = b;
    state[2] = c;
    state[3] = d;
    return (high * 67108864 + low + 0.5) * 2.220446049250313e-16;
  }
}

function scramble(word: number): number {
  const product = Math.imul(word, 5);
  return Math.imul((product << 7) | (product >>> 25), 9);
}
