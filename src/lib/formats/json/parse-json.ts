import { maxDepth } from '../limits';
import type { JsonNode } from './node';

/** A syntax error: where it is (offset) and what to do. */
export interface JsonError {
  at: number;
  message: string;
  fix: string;
}

export type ParsedJson = { ok: true; root: JsonNode } | { ok: false; error: JsonError };

class Stop extends Error {
  constructor(readonly error: JsonError) {
    super(error.message);
  }
}

const python = 'Write it with a JSON library (json.dumps in Python): keys and texts stand in double quotes.';

/**
 * Parses JSON (RFC 8259) into nodes with places.
 *
 * Own parser, because `JSON.parse` drops repeated keys, rounds large numbers and does not say
 * where a value stood. `NaN` and `Infinity`, which some programs write, are kept as numbers for
 * the reader to refuse with their place. Depth and number of values are limited, so that no input
 * overflows the stack or the memory.
 */
export function parseJson(text: string, maxValues: number): ParsedJson {
  try {
    const parser = new Parser(text, maxValues);
    return { ok: true, root: parser.document() };
  } catch (error) {
    if (error instanceof Stop) return { ok: false, error: error.error };
    throw error;
  }
}

class Parser {
  private at = 0;
  private values = 0;
  private readonly number = /-?(?:\d+(?:\.\d+)?(?:[eE][+-]?\d+)?|Infinity)|NaN/y;
  private readonly blanks = /[ \t\n\r]*/y;

  constructor(
    private readonly text: string,
    private readonly maxValues: number
  ) {}

  document(): JsonNode {
    const root = this.value(0);
    this.skip();
    if (this.at < this.text.length) {
      this.stop(
        'There is more text after the end of the value.',
        'Give one JSON value: an object or a list.'
      );
    }
    return root;
  }

  private stop(message: string, fix: string): never {
    throw new Stop({ at: this.at, message, fix });
  }

  private skip(): string | undefined {
    this.blanks.lastIndex = this.at;
    this.blanks.exec(this.text);
    this.at = this.blanks.lastIndex;
    return this.text[this.at];
  }

  private value(depth: number): JsonNode {
    const first = this.skip();
    const at = this.at;
    this.values += 1;
    if (this.values > this.maxValues) {
      this.stop(
        `There are more than ${this.maxValues} values.`,
        'Sum shots of equal count into a histogram, or give a plain list of counts, one a line.'
      );
    }
    if (depth > maxDepth)
      this.stop(`Brackets are nested more than ${maxDepth} deep.`, 'Give {"counts": {"0": 12, "1": 30}}.');
    if (first === '{') return this.object(at, depth);
    if (first === '[') return this.array(at, depth);
    if (first === '"') return { kind: 'string', at, value: this.string() };
    for (const [word, value] of literals) {
      if (!this.text.startsWith(word, at)) continue;
      this.at += word.length;
      return { kind: 'literal', at, value };
    }
    this.number.lastIndex = at;
    const raw = this.number.exec(this.text)?.[0];
    if (raw === undefined) return this.unexpected('a value');
    if (/^-?0\d/.test(raw)) this.stop(`${raw} starts with a zero.`, 'Write numbers without zeros in front.');
    this.at = this.number.lastIndex;
    return { kind: 'number', at, raw };
  }

  private unexpected(wanted: string): never {
    const found = this.text[this.at];
    if (found === undefined)
      this.stop(`The text ends where ${wanted} should stand.`, 'The file may be cut off; save it again.');
    if (found === "'" || /[A-Za-z_]/.test(found))
      this.stop(`"${found}" stands where ${wanted} should.`, python);
    const comma = /,\s*$/.test(this.text.slice(Math.max(0, this.at - 200), this.at)) && /[\]}]/.test(found);
    if (comma) this.stop(`A comma stands before "${found}".`, 'Take the last comma out.');
    this.stop(`"${found}" stands where ${wanted} should.`, 'Correct the JSON.');
  }

  private array(at: number, depth: number): JsonNode {
    const items: JsonNode[] = [];
    this.at += 1;
    if (this.skip() === ']') this.at += 1;
    else {
      do items.push(this.value(depth + 1));
      while (this.more(']'));
    }
    return { kind: 'array', at, items };
  }

  private object(at: number, depth: number): JsonNode {
    const members: { key: string; at: number; value: JsonNode }[] = [];
    this.at += 1;
    if (this.skip() === '}') this.at += 1;
    else {
      do {
        if (this.skip() !== '"') {
          if (/\d/.test(this.text[this.at] ?? '')) this.stop('A key stands without quotation marks.', python);
          this.unexpected('a key in double quotes');
        }
        const keyAt = this.at;
        const key = this.string();
        if (this.skip() !== ':') this.unexpected('a colon');
        this.at += 1;
        members.push({ key, at: keyAt, value: this.value(depth + 1) });
      } while (this.more('}'));
    }
    return { kind: 'object', at, members };
  }

  /** Steps over a comma, or over the closing bracket and then says that the list is over. */
  private more(close: string): boolean {
    const next = this.skip();
    if (next !== ',' && next !== close) this.unexpected(`a comma or "${close}"`);
    this.at += 1;
    return next === ',';
  }

  private string(): string {
    const start = this.at;
    let end = start + 1;
    for (;;) {
      const code = this.text.charCodeAt(end);
      if (code === 34) break;
      // NaN past the end of the text; line ends may not stand in a JSON string.
      if (!(code >= 32)) this.stop('A quotation mark is opened and not closed on its line.', 'Close it.');
      end += code === 92 ? 2 : 1;
    }
    this.at = end + 1;
    const raw = this.text.slice(start, this.at);
    if (!raw.includes('\\')) return raw.slice(1, -1);
    try {
      return JSON.parse(raw) as string;
    } catch {
      this.at = start;
      return this.stop('A backslash in this text means nothing in JSON.', 'Write \\\\ for a backslash.');
    }
  }
}

const literals: [string, boolean | null][] = [
  ['true', true],
  ['false', false],
  ['null', null]
];
