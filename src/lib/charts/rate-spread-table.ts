import { VERDICTS } from '$lib/model/labels';
import type { RateSpread } from '$lib/stats/rate-interval/types';
import type { Table } from './table';

/** The answer at every misread rate tried over the interval of a rate with an uncertainty. */
export const rateSpreadTable = ({ rates }: RateSpread): Table => ({
  columns: [
    { title: 'misread rate', kind: 'number' },
    { title: 'ceiling', kind: 'number' },
    { title: 'variance over ceiling', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'answer', kind: 'text' }
  ],
  rows: rates.map(({ rate, ceiling, dispersion, verdict }) => [
    rate,
    ceiling,
    dispersion.value,
    dispersion.low,
    dispersion.high,
    VERDICTS[verdict]
  ])
});
