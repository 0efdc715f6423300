import type { ReadOptions, ReadResult } from '$lib/formats/types';
import type { ReadAnswer, ReadRequest } from './messages';

/** `superseded`: a newer request took its place. `failed`: the worker could not be had. */
export type NoResult = 'superseded' | 'failed';

/** Reads input in a worker that stays; the last request wins. */
export class Reader {
  #worker: Worker | null = null;
  #last = 0;
  #waiting: { id: number; settle: (result: ReadResult | NoResult) => void } | null = null;

  read(input: string | Uint8Array, options: ReadOptions): Promise<ReadResult | NoResult> {
    this.#waiting?.settle('superseded');
    const id = ++this.#last;
    return new Promise((settle) => {
      this.#waiting = { id, settle };
      const request: ReadRequest = { id, input, options };
      this.#open().postMessage(request);
    });
  }

  close(why: NoResult = 'superseded'): void {
    this.#worker?.terminate();
    this.#worker = null;
    this.#waiting?.settle(why);
    this.#waiting = null;
  }

  #open(): Worker {
    if (this.#worker) return this.#worker;
    const worker = new Worker(new URL('./read.worker.ts', import.meta.url), { type: 'module' });
    worker.onmessage = ({ data }: MessageEvent<ReadAnswer>) => {
      if (data.id !== this.#waiting?.id) return;
      this.#waiting.settle(data.result);
      this.#waiting = null;
    };
    worker.onerror = () => this.close('failed');
    this.#worker = worker;
    return worker;
  }
}
