import { expect, it } from 'vitest';
import { alignTable } from '$lib/model/plain-text/align-table';

it('alignTable puts decimal points under each other and words to the left', () => {
  const table = alignTable([
    { title: 'law', numeric: false, cells: ['a', 'long name', 'b'] },
    { title: 'value', numeric: true, cells: ['1.25', '12', '4.1 × 10⁻⁵'] }
  ]);
  expect(table).toBe(
    ['  law              value', '  a           1.25', '  long name  12', '  b           4.1 × 10⁻⁵'].join(
      '\n'
    )
  );
  const points = table
    .split('\n')
    .filter((line) => line.includes('.'))
    .map((line) => line.indexOf('.'));
  expect(new Set(points).size).toBe(1);
});
