/** Which datasets are offered for a sweep. Empty texts ask for nothing. */
export interface SweepFilter {
  axis: 'quench-time' | 'hold-time';
  device: string;
  firmware: string;
  group: string;
  unit: '' | 'defect' | 'pair';
  /** Ids that were handed over; empty for all that fit. */
  datasets: string[];
}

/** A filter from an address: a part that is not understood counts as not given. */
export function readSweepFilter(search: URLSearchParams): SweepFilter {
  const text = (name: string) => (search.get(name) ?? '').trim().slice(0, 200);
  const unit = text('unit');
  return {
    axis: text('axis') === 'hold-time' ? 'hold-time' : 'quench-time',
    device: text('device'),
    firmware: text('firmware'),
    group: text('group'),
    unit: unit === 'defect' || unit === 'pair' ? unit : '',
    datasets: [...new Set(search.getAll('dataset'))].slice(0, 1000)
  };
}
