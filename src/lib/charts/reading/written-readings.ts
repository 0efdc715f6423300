import type { Picture } from '../picture';

/** Up to so many readings come with the page: a hundred bytes each, of 10 000 counts a megabyte for every chart. */
const MOST = 300;

/** Readings in markup: place and words of each. */
export interface WrittenReadings {
  order: Picture['order'];
  readings: [x: number, y: number, words: string][];
}

/** Readings of a chart that the server draws, as JSON for its markup; undefined where they are too many for that. */
export function writtenReadings({ order, readings }: Picture): string | undefined {
  if (readings.length > MOST) return undefined;
  const tenth = (value: number): number => Math.round(value * 10) / 10;
  const written: WrittenReadings = {
    order,
    readings: readings.map(({ x, y, words }) => [tenth(x), tenth(y), words()])
  };
  return JSON.stringify(written);
}
