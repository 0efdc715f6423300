/** One line of the team's sweeps. */
export interface SweepRow {
  id: string;
  name: string;
  axis: 'quench-time' | 'hold-time';
  datasets: number;
  statement: string;
  by: string | null;
  createdAt: number;
}

/** One page of them; `all` and `total` are the same, since nothing is filtered. */
export interface SweepList {
  rows: SweepRow[];
  total: number;
  all: number;
  page: number;
  size: number;
}
