import { parseArgs } from 'node:util';
import type { ReadOptions, Role } from '$lib/formats/types';
import { readKept } from '$lib/model/read-kept';
import type { DiagnoseOptions } from '$lib/stats/types';
import { Refusal } from '../shared/exit-codes';

/** What the command line asks for. */
export interface Asked {
  file: string;
  /** Only what was given; the rest comes from the file or from the defaults. */
  diagnose: Partial<DiagnoseOptions>;
  read: ReadOptions;
  supplied: string | null;
  dataset: string | null;
  print: 'text' | 'json' | 'csv';
  /** Where to write the report as a PDF; null for nowhere. */
  pdf: string | null;
  /** Where to write everything as a zip; null for nowhere. */
  bundle: string | null;
  quiet: boolean;
  failOn: 'ruled-out' | 'undecided' | null;
}

const text = { type: 'string' } as const;
const several = { type: 'string', multiple: true } as const;
const flag = { type: 'boolean' } as const;
const options = {
  trials: text,
  unit: text,
  geometry: text,
  misread: text,
  'misread-uncertainty': text,
  kept: text,
  supplied: text,
  alpha: text,
  tolerance: text,
  resamples: text,
  seed: text,
  format: text,
  separator: text,
  header: text,
  decimal: text,
  thousands: text,
  encoding: text,
  'count-column': text,
  'shots-column': text,
  'shot-column': text,
  'batch-column': several,
  'condition-column': several,
  'ignore-column': several,
  dataset: text,
  json: flag,
  csv: flag,
  text: flag,
  pdf: text,
  bundle: text,
  quiet: flag,
  'fail-on': text,
  help: flag
} as const;

const columnRoles: [keyof typeof options, Role][] = [
  ['count-column', 'count'],
  ['shots-column', 'frequency'],
  ['shot-column', 'shot'],
  ['batch-column', 'batch'],
  ['condition-column', 'condition'],
  ['ignore-column', 'ignored']
];

/**
 * Reads the arguments of the command.
 *
 * @returns what is asked, or `help`.
 * @throws Refusal that names the option and what it takes. Ranges are checked by the engine.
 */
export function parseOptions(args: string[]): Asked | 'help' {
  const { values, positionals } = parse(args);
  if (values.help) return 'help';
  if (positionals.length !== 1) {
    throw new Refusal([
      positionals.length === 0 ? 'No file is named.' : `${positionals.length} files are named; give one.`,
      'Usage: npm run --silent diagnose -- FILE [options]; --help lists the options.'
    ]);
  }
  const printed = (['json', 'csv', 'text'] as const).filter((name) => values[name]);
  if (printed.length > 1)
    throw new Refusal([`Both --${printed[0]} and --${printed[1]} are asked for; give one.`]);
  const one = <T>(name: keyof typeof options, allowed: Record<string, T>): T | undefined => {
    const value = values[name];
    if (typeof value !== 'string') return undefined;
    if (Object.hasOwn(allowed, value)) return allowed[value];
    throw new Refusal([`--${name} takes ${Object.keys(allowed).join(', ')}, not "${value}".`]);
  };
  const number = (name: keyof typeof options, what: string): number | undefined => {
    const value = values[name];
    if (typeof value !== 'string') return undefined;
    // Number('') is 0 and Number('0x1') is 1: neither was meant.
    if (/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(value)) return Number(value);
    throw new Refusal([`--${name} takes ${what}, not "${value}".`]);
  };
  const orUnknown = (name: 'trials' | 'misread', what: string) =>
    values[name] === 'unknown' ? null : number(name, `${what}, or unknown`);
  const columns = columnRoles.flatMap(([name, role]) => {
    const given = values[name];
    const names = typeof given === 'string' ? [given] : Array.isArray(given) ? given : [];
    return names.map((column) => ({ column: /^\d+$/.test(column) ? Number(column) : column, role }));
  });
  const trials = orUnknown('trials', 'a whole number');
  const diagnose: Partial<DiagnoseOptions> = {
    trials,
    unit: one('unit', { defect: 'defect', pair: 'pair' } as const),
    geometry: one('geometry', {
      sites: 'sites',
      'open-bonds': 'open-bonds',
      'ring-bonds': 'ring-bonds'
    } as const),
    misread: orUnknown('misread', 'a probability such as 0.01'),
    misreadUncertainty: number('misread-uncertainty', 'a standard uncertainty such as 0.001'),
    kept: keptOf(values.kept),
    alpha: number('alpha', 'a number such as 0.01'),
    tolerance: number('tolerance', 'a number such as 0.1'),
    resamples: number('resamples', 'a whole number'),
    seed: number('seed', 'a whole number')
  };
  const read: ReadOptions = {
    format: one('format', {
      auto: 'auto',
      counts: 'counts',
      shots: 'shots',
      positions: 'positions',
      json: 'json'
    } as const),
    separator: one('separator', {
      comma: 'comma',
      semicolon: 'semicolon',
      tab: 'tab',
      spaces: 'spaces',
      none: 'none'
    } as const),
    header: one('header', { yes: true, no: false }),
    decimal: one('decimal', { point: '.', comma: ',' } as const),
    thousands: one('thousands', { none: 'none', comma: ',', point: '.' } as const),
    encoding: one('encoding', {
      'utf-8': 'utf-8',
      'utf-16le': 'utf-16le',
      'utf-16be': 'utf-16be',
      'windows-1252': 'windows-1252'
    } as const),
    trials
  };
  if (columns.length > 0) read.columns = columns;
  return {
    file: positionals[0],
    diagnose: given(diagnose),
    read: given(read),
    supplied: values.supplied ?? null,
    dataset: values.dataset ?? null,
    print: printed[0] ?? 'text',
    pdf: values.pdf ?? null,
    bundle: values.bundle ?? null,
    quiet: values.quiet ?? false,
    failOn: one('fail-on', { 'ruled-out': 'ruled-out', undecided: 'undecided' } as const) ?? null
  };
}

/** "1-4", or "1-" where nothing was cut above. */
function keptOf(typed: string | undefined): DiagnoseOptions['kept'] | undefined {
  if (typed === undefined) return undefined;
  const kept = readKept(typed);
  if (kept) return kept;
  throw new Refusal([`--kept takes the smallest and the largest count kept, as 0-4 or 1-, not "${typed}".`]);
}

function parse(args: string[]) {
  try {
    return parseArgs({ args: joined(args), options, allowPositionals: true, strict: true });
  } catch (error) {
    // Node's own sentence names the option; its hint about "--" would only confuse.
    const reason = error instanceof Error ? error.message.split(/\. (?=To |Did )|\n/)[0] : String(error);
    throw new Refusal([`${reason.replace(/\.$/, '')}. --help lists the options.`]);
  }
}

/** "--seed -1" as "--seed=-1": parseArgs would take the number for another option, and call it ambiguous. */
function joined(args: string[]): string[] {
  const out: string[] = [];
  for (const arg of args) {
    const before = out[out.length - 1];
    if (/^-[\d.]/.test(arg) && before?.startsWith('--') && before !== '--' && !before.includes('=')) {
      out[out.length - 1] = `${before}=${arg}`;
    } else out.push(arg);
  }
  return out;
}

/** Only the entries that have a value, so that spreading them over others changes nothing else. */
function given<T extends object>(values: T): T {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as T;
}
