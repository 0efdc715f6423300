import { setTimeout as sleep } from 'node:timers/promises';

/** A thread that goes wrong in the way that the seed of its task asks for; the runner is tested against it. */
export default async function odd({ options, port }) {
  if (options.seed === 1) process.exit(3);
  if (options.seed === 2) {
    const kept = [];
    for (;;) kept.push(new Array(100_000).fill(kept.length));
  }
  if (options.seed === 3) throw new Error('a planted fault');
  if (options.seed === 4) {
    port.postMessage({ share: 0.5, step: 'resampling' });
    await sleep(3_600_000);
  }
  // Never gives way, as a long fit may not.
  if (options.seed === 5) for (;;);
  port.close();
  return { kind: 'refused', reason: 'The odd thread refuses everything.' };
}
