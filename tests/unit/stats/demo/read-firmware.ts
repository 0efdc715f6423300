/** Counts of a file of fixtures/firmware. */
export const readCsv = (text: string): [number, number][] =>
  text
    .trim()
    .split('\n')
    .slice(2)
    .map((line) => line.split(',').map(Number) as [number, number]);
