/** CPU seconds of this process so far, all its threads: waiting for a busy machine does not count. */
export function cpuSeconds(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1e6;
}

/** Least CPU a batch must take: the clock of a process ticks in steps of up to 10 ms. */
const batch = 0.2;

/**
 * Median CPU seconds of one call over seven batches, each long enough for the clock, after one batch to warm up.
 * A call that takes long by itself is a batch.
 */
export function medianOfSeven(call: () => void): number {
  let calls = 1;
  for (;;) {
    const took = run(call, calls);
    if (took >= batch) break;
    calls = Math.max(calls + 1, Math.ceil(took > 0.02 ? (calls * batch * 1.2) / took : calls * 4));
  }
  const times = Array.from({ length: 7 }, () => run(call, calls) / calls);
  return median(times);
}

/** Middle one of an odd number of values. */
export function median(values: number[]): number {
  return [...values].sort((a, b) => a - b)[values.length >> 1];
}

function run(call: () => void, calls: number): number {
  const start = cpuSeconds();
  for (let i = 0; i < calls; i++) call();
  return cpuSeconds() - start;
}
