import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Histogram } from '../types';

/**
 * "sha256:…" of the canonical histogram: the line "severalty.histogram/1", then "count shots" a line in
 * ascending order without empty rows, before them "0-to shots" for an opening row, after them "from+ shots" for a lump; each line ends with a newline.
 *
 * Anyone can recompute it with a text editor and sha256sum.
 */
export function digest(histogram: Histogram): string {
  const { below } = histogram;
  const lines = [
    'severalty.histogram/1',
    ...(below ? [`0-${below.to} ${below.shots}`] : []),
    ...histogram.counts.map(([count, shots]) => `${count} ${shots}`)
  ];
  if (histogram.lump) lines.push(`${histogram.lump.from}+ ${histogram.lump.shots}`);
  return `sha256:${bytesToHex(sha256(utf8ToBytes(lines.join('\n') + '\n')))}`;
}
