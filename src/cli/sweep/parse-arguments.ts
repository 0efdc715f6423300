import { parseArgs } from 'node:util';
import type { SweepOptions } from '$lib/stats/sweep/types';
import { Refusal } from '../shared/exit-codes';

export interface AskedSweep {
  file: string;
  options: Omit<SweepOptions, 'timeUnit' | 'window'>;
  from: number | null;
  to: number | null;
  json: boolean;
}

const text = { type: 'string' } as const;
const flag = { type: 'boolean' } as const;
const known = {
  axis: text,
  unit: text,
  from: text,
  to: text,
  transition: text,
  alpha: text,
  json: flag,
  text: flag,
  help: flag
} as const;

/**
 * Reads the arguments of `sweep`.
 *
 * @throws Refusal that names the option and what it takes
 */
export function parseArguments(args: string[]): AskedSweep | 'help' {
  const { values, positionals } = parse(args);
  if (values.help) return 'help';
  if (positionals.length !== 1)
    throw new Refusal([
      positionals.length === 0 ? 'No file is named.' : `${positionals.length} files are named; give one.`,
      'Usage: npm run --silent sweep -- FILE [options]; --help lists the options.'
    ]);
  if (values.json && values.text) throw new Refusal(['Both --json and --text are asked for; give one.']);
  const axis = oneOf('axis', values.axis ?? 'quench', ['quench', 'hold'] as const);
  return {
    file: positionals[0],
    options: {
      axis: axis === 'quench' ? 'quench-time' : 'hold-time',
      unit: oneOf('unit', values.unit ?? 'defect', ['defect', 'pair'] as const),
      transition: values.transition === undefined ? null : transitionOf(values.transition),
      alpha: numberOf('alpha', values.alpha ?? '0.05', 'a level such as 0.05')
    },
    from: values.from === undefined ? null : numberOf('from', values.from, 'a time above 0'),
    to: values.to === undefined ? null : numberOf('to', values.to, 'a time above 0'),
    json: values.json ?? false
  };
}

function parse(args: string[]) {
  try {
    return parseArgs({ args, options: known, allowPositionals: true, strict: true });
  } catch (error) {
    throw new Refusal([error instanceof Error ? error.message : String(error)]);
  }
}

function oneOf<T extends string>(name: string, value: string, allowed: readonly T[]): T {
  const found = allowed.find((one) => one === value);
  if (found === undefined) throw new Refusal([`--${name} takes ${allowed.join(' or ')}, not "${value}".`]);
  return found;
}

function numberOf(name: string, value: string, what: string): number {
  // Number('') is 0 and Number('0x1') is 1: neither was meant.
  if (/^(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(value) && Number(value) > 0) return Number(value);
  throw new Refusal([`--${name} takes ${what}, not "${value}".`]);
}

function transitionOf(value: string): SweepOptions['transition'] {
  const parts = value.split(',');
  if (parts.length !== 3)
    throw new Refusal([`--transition takes three numbers d,ν,z such as 1,1,1, not "${value}".`]);
  const [dimension, correlation, dynamic] = parts.map((part) =>
    numberOf('transition', part.trim(), 'three numbers above 0, such as 1,1,1')
  );
  return { dimension, correlation, dynamic };
}
