import type { OnProgress, Progress } from '../types';
import type { Pace } from './pace';

/** Between turns of the event loop; a page needs one every 100 ms to feel alive, and each costs a few. */
const interval = 60;

/** The pace of a whole diagnosis: named steps, and a part of the whole for each long loop. */
export interface Pacer {
  step(step: Progress['step'], share: number): Promise<void>;
  /** Pace of a loop that runs from share `from` to share `to`. */
  within(from: number, to: number): Pace;
}

/** Reports progress, gives way to the event loop, and rejects once `signal` is aborted. */
export function pacer(onProgress?: OnProgress, signal?: AbortSignal): Pacer {
  let last = Date.now();
  let step: Progress['step'] = 'fit';
  const rest = async (share: number) => {
    onProgress?.({ share, step });
    await new Promise((resolve) => setTimeout(resolve, 0));
    signal?.throwIfAborted();
    last = Date.now();
  };
  return {
    async step(name, share) {
      step = name;
      await rest(share);
    },
    within: (from, to) => ({
      async breathe(share) {
        if (Date.now() - last >= interval) await rest(from + (to - from) * Math.min(1, share));
      }
    })
  };
}
