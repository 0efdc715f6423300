import { readWholeNumber } from '../number/read-whole-number';
import { sayBadNumber } from '../number/say-bad-number';
import type { Source } from '../source';
import { placeOf } from '../text/place-of';
import { describe, type JsonNode } from './node';

/** JSON numbers have a decimal point and no grouping. */
export const jsonStyle = { decimal: '.', thousands: 'none' } as const;

/** Reads values out of JSON nodes, reporting the bad ones with their place. */
export class JsonReader {
  zeroDecimals = 0;

  constructor(readonly source: Source) {}

  place(at: number): { line: number; column: number } {
    return placeOf(this.source.text, at);
  }

  problem(at: number, message: string, fix: string): void {
    this.source.problems.add(() => ({ ...this.place(at), message, fix }));
  }

  /** The whole number of a node (digits in quotes are understood), or null after a problem. */
  whole(node: JsonNode, what: string): number | null {
    if (node.kind !== 'number' && node.kind !== 'string') {
      this.problem(node.at, `Here stands ${describe(node)}, not a number.`, `Give ${what} as whole numbers.`);
      return null;
    }
    return this.text(node.kind === 'number' ? node.raw : node.value, node.at, what);
  }

  /** The whole number in a text, or null after a problem. */
  text(raw: string, at: number, what: string): number | null {
    const read = readWholeNumber(raw, jsonStyle);
    if (read.ok) {
      if (read.written === 'zero-decimal') this.zeroDecimals += 1;
      return read.value;
    }
    this.source.problems.add(() => ({ ...this.place(at), ...sayBadNumber(read.bad, raw, what) }));
    return null;
  }
}
