import type { ShownPlan } from './power-picture';
import type { Table } from './table';

/** The points of the power chart. */
export const powerTable = ({ curve }: ShownPlan): Table => ({
  columns: [
    { title: 'shots', kind: 'whole' },
    { title: 'power', kind: 'number' }
  ],
  rows: curve
});
