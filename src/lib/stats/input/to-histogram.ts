import { BadInput, type CountData, type Histogram } from '../types';
import { formatCount } from '../words/format-number';

/** Counts of a shot list summed, or a histogram put in order and checked; rows without shots are dropped. */
export function toHistogram(data: CountData): Histogram {
  const histogram = data.kind === 'shots' ? summed(data.shots) : data;
  const given = histogram.below && histogram.below.shots !== 0 ? histogram.below : null;
  // "0 to 0" is the row of the empty shots.
  const empty: [number, number][] = given?.to === 0 ? [[0, given.shots]] : [];
  const below = given && given.to !== 0 ? given : null;
  const counts = [...empty, ...histogram.counts]
    .filter(([, shots]) => shots !== 0)
    .sort((a, b) => a[0] - b[0]);
  const lump = histogram.lump && histogram.lump.shots !== 0 ? histogram.lump : null;
  let total = 0;
  let before = -1;
  const rows = [
    ...(below ? [[below.to, below.shots]] : []),
    ...counts,
    ...(lump ? [[lump.from, lump.shots]] : [])
  ];
  for (const [count, shots] of rows) {
    if (!Number.isSafeInteger(count) || count < 0)
      throw new BadInput(`A count must be a whole number from 0 up, not ${count}.`);
    if (!Number.isSafeInteger(shots) || shots < 0) {
      throw new BadInput(
        `The number of shots must be a whole number from 0 up, not ${shots} (count ${count}).`
      );
    }
    if (count <= before)
      throw new BadInput(`The count ${count} stands twice, or inside a row that lumps counts.`);
    before = count;
    total += shots;
  }
  if (!(total > 0)) throw new BadInput('There are no shots.');
  if (total > Number.MAX_SAFE_INTEGER)
    throw new BadInput('The shots sum to more than 2^53, beyond which they cannot be told apart.');
  if (counts.length === 0) {
    const row =
      lump && below
        ? 'a row that lumps counts'
        : lump
          ? `the closing row "${lump.from} or more"`
          : `the opening row "${below!.to} or fewer"`;
    throw new BadInput(
      `Every shot is in ${row}: nothing is left to compare. Give some of these counts rows of their own.`
    );
  }
  const first = rows[0][0];
  if (before - first > widest) {
    throw new BadInput(
      `The counts reach from ${formatCount(first)} to ${formatCount(before)}; at most ${formatCount(widest)} neighbouring counts can be diagnosed.`
    );
  }
  return { kind: 'histogram', counts, lump, ...(below && { below }) };
}

/** A document of more rows than this is no longer read by anyone, and its laws would take minutes. */
const widest = 20_000;

/** Counts below it are summed in arrays, a nanosecond each where a map takes ten. */
const common = 65_536;

function summed(shots: number[] | Uint32Array): Histogram {
  // Two, since a cell that was written just now is slow to read again, and neighbouring shots are often alike.
  const even = new Uint32Array(common);
  const odd = new Uint32Array(common);
  const seldom = new Map<number, number>();
  const add = (count: number, into: Uint32Array) => {
    // What is no whole number finds no cell of an array, and is refused with the map's.
    if (count < common && count >>> 0 === count) into[count] += 1;
    else seldom.set(count, (seldom.get(count) ?? 0) + 1);
  };
  for (let i = 0; i + 1 < shots.length; i += 2) {
    add(shots[i], even);
    add(shots[i + 1], odd);
  }
  if (shots.length % 2 === 1) add(shots[shots.length - 1], even);
  const counts: [number, number][] = [];
  even.forEach((seen, count) => seen + odd[count] > 0 && counts.push([count, seen + odd[count]]));
  return { kind: 'histogram', counts: [...counts, ...seldom], lump: null };
}
