import type { Pace } from '../resampling/pace';
import { stream } from '../resampling/streams';
import type { CountData, TestId, TestResult } from '../types';
import { batchesTest } from './batches-test';
import type { OrderOutcome } from './order-outcome';
import { orderTest } from './order-test';

/** Tests of the order in which shots were taken, and those that could not run. */
export interface OrderTests {
  tests: Omit<TestResult, 'pAdjusted'>[];
  notRun: { id: TestId; reason: string }[];
  /** Fewer runs than chance gives: neighbouring shots are alike. More: they alternate. null without order. */
  neighbours: 'alike' | 'alternating' | null;
}

/** Batches and order of a shot list; a histogram keeps neither. */
export async function orderTests(
  data: CountData,
  options: { resamples: number; seed: number },
  pace: Pace
): Promise<OrderTests> {
  const out: OrderTests = { tests: [], notRun: [], neighbours: null };
  const take = (id: TestId, outcome: OrderOutcome<object>) => {
    if (!outcome.ok) {
      out.notRun.push({ id, reason: outcome.reason });
      return;
    }
    const { statistic, p, smallestP, source, resamples, stoppedEarly } = outcome;
    out.tests.push({ id, statistic, p, smallestP, source, resamples, stoppedEarly });
  };
  const none = (reason: string) => ({ ok: false as const, reason });
  if (data.kind === 'histogram') {
    take('batches', none('A histogram does not keep batches.'));
    take('order', none('A histogram does not keep the order of shots.'));
    return out;
  }
  const { shots, batches } = data;
  const half = (from: number): Pace => ({ breathe: (share) => pace.breathe(from + share / 2) });
  const grouped = batches
    ? await batchesTest(shots, batches, { ...options, stream: stream('batches', 0) }, half(0))
    : none('No batches were given.');
  take('batches', grouped);
  const order = await orderTest(shots, { ...options, stream: stream('shot order', 0) }, half(0.5));
  take('order', order);
  if (order.ok) out.neighbours = order.runs <= order.runsExpected ? 'alike' : 'alternating';
  return out;
}
