import { SequentialP } from '../multiple/sequential-p';
import { generator } from '../random/generator';
import { shuffle } from '../random/shuffle';
import type { Pace } from '../resampling/pace';
import { progress } from '../resampling/progress';
import type { OrderOptions, OrderResult } from './order-outcome';

/**
 * Permutation p-value: shuffles the shots until the sequential rule has enough. Each permutation starts from the
 * given order with a stream of its own, so the result does not depend on how the work is paced.
 *
 * A permutation costs up to 50 ns a shot, so long lists get fewer: 4e7/S, and 99 at least. The smallest p then says so.
 *
 * @param shots counts in the order taken; left as they are
 * @param reaches whether an order of the shots is at least as extreme as the one observed, equality included
 */
export async function permute(
  shots: Float64Array,
  reaches: (order: Float64Array) => boolean,
  { resamples, seed, stream = 0 }: OrderOptions,
  pace: Pace
): Promise<Omit<OrderResult, 'statistic'>> {
  const order = new Float64Array(shots.length);
  const affordable = Math.max(99, Math.floor(4e7 / shots.length));
  const sequence = new SequentialP(Math.min(resamples, affordable));
  for (let b = 0; !sequence.done; b++) {
    order.set(shots);
    shuffle(generator(seed, stream + b), order);
    sequence.push(reaches(order));
    await pace.breathe(progress(sequence));
  }
  const { p, smallestP, draws, stoppedEarly } = sequence;
  return { p, smallestP, resamples: draws, stoppedEarly, source: 'permuted' };
}
