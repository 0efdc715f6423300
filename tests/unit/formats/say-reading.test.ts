import { expect, it } from 'vitest';
import { readCounts } from '$lib/formats/read-counts';
import { sayReading } from '$lib/formats/say-reading';

it('sayReading names the format, every column with its reason, and what is unusual', () => {
  const { reading } = readCounts(
    'device;kinks;Anzahl Schüsse;p\nA;0;1.149.265;0,2\nA;1;3,0;0,8\nA;10+;2;0\n'
  );
  expect(sayReading(reading)).toEqual([
    'Read as a table of counts, cells apart by semicolons, names in the first row (a column of counts and one of numbers of shots).',
    'Column "device" is a condition (its name, "device").',
    'Column "kinks" is the count (its name, "kinks").',
    'Column "Anzahl Schüsse" is the number of shots (its name, "Anzahl Schüsse").',
    'Column "p" is not used (its name, "p": not a number of shots).',
    'Line 4 is read as "10 or more".',
    'Commas are read as decimal marks.',
    'Digits are grouped by points.'
  ]);
});
