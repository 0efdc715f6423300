import type { OnProgress } from '$lib/stats/types';

/** Nothing is shown for work that is done sooner. */
const patience = 1000;

/**
 * A line of progress with the time left on standard error, where that is a terminal; `clear` takes
 * it away again.
 */
export function progressLine(): { show: OnProgress; clear: () => void } {
  const start = performance.now();
  let shown = false;
  const write = (line: string) => process.stderr.write(`\r\u001b[K${line}`);
  return {
    show({ share, step }) {
      const passed = performance.now() - start;
      if (!process.stderr.isTTY || passed < patience || share <= 0) return;
      shown = true;
      const left = Math.ceil((passed * (1 - share)) / share / 1000);
      write(`${step}: ${Math.floor(100 * share)} %, about ${left} s left; Ctrl-C stops`);
    },
    clear() {
      if (shown) write('');
    }
  };
}
