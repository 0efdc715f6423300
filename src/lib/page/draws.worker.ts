import { rangeAnswerer, type RangeRequest } from '$lib/stats/resampling/range-answerer';

const answer = rangeAnswerer();

/** Makes draws for a diagnosis worker, and ends with it. */
self.onmessage = ({ data }: MessageEvent<RangeRequest>) => self.postMessage(answer(data));
