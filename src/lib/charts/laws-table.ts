import type { KnownInterval, SweepReport } from '$lib/stats/sweep/types';
import type { Table } from './table';

/** Exponents of the power laws, each by itself and all as one, with what tying them costs. */
export function lawsTable({ laws }: Pick<SweepReport, 'laws'>): Table {
  const row = (name: string, { value, low, high }: KnownInterval, fit: (number | null)[]) => [
    name,
    value,
    low,
    high,
    ...fit
  ];
  return {
    columns: [
      { title: 'cumulant', kind: 'text' },
      { title: 'exponent', kind: 'number' },
      { title: 'low', kind: 'number' },
      { title: 'high', kind: 'number' },
      { title: 'χ²', kind: 'number' },
      { title: 'degrees of freedom', kind: 'whole' },
      { title: 'p', kind: 'number' }
    ],
    rows: laws
      ? [
          ...laws.exponents.map((one, q) =>
            row(
              ['κ₁', 'κ₂', 'κ₃'][q],
              one,
              q === 0 ? [laws.chiSquare, laws.freedom, laws.p] : [null, null, null]
            )
          ),
          row('one for all', laws.common.exponent, [
            laws.common.chiSquare,
            laws.common.freedom,
            laws.common.p
          ])
        ]
      : []
  };
}
