import { expect, it } from 'vitest';
import { sourceFiles } from '../../support/source-files';

const LONGEST = 220;

it(`no file of src or tests is longer than ${LONGEST} lines`, () => {
  const files = sourceFiles(['src', 'tests']);
  expect(files.length).toBeGreaterThan(50);
  const long = files
    .map(({ path, text }) => ({ path, lines: text.split('\n').length - 1 }))
    .filter(({ lines }) => lines > LONGEST)
    .map(({ path, lines }) => `${path}: ${lines}`);
  expect(long).toEqual([]);
});
