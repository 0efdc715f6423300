import { readCounts } from '$lib/formats/read-counts';
import type { ReadAnswer, ReadRequest } from './messages';

/** Reads counts away from the page, so that a large file does not freeze it. */
self.onmessage = ({ data }: MessageEvent<ReadRequest>) => {
  const answer: ReadAnswer = { id: data.id, result: readCounts(data.input, data.options) };
  self.postMessage(answer);
};
