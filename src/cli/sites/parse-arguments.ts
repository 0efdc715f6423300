import { parseArgs } from 'node:util';
import type { SitesOptions } from '$lib/stats/sites/sites-types';
import { Refusal } from '../shared/exit-codes';

export interface AskedSites {
  file: string;
  options: SitesOptions;
  json: boolean;
}

const text = { type: 'string' } as const;
const flag = { type: 'boolean' } as const;
const known = { geometry: text, seek: text, alpha: text, json: flag, text: flag, help: flag } as const;

/**
 * Reads the arguments of `sites`.
 *
 * @throws Refusal that names the option and what it takes
 */
export function parseArguments(args: string[]): AskedSites | 'help' {
  const { values, positionals } = parse(args);
  if (values.help) return 'help';
  if (positionals.length !== 1)
    throw new Refusal([
      positionals.length === 0 ? 'No file is named.' : `${positionals.length} files are named; give one.`,
      'Usage: npm run --silent sites -- FILE [options]; --help lists the options.'
    ]);
  if (values.json && values.text) throw new Refusal(['Both --json and --text are asked for; give one.']);
  return {
    file: positionals[0],
    options: {
      geometry: oneOf('geometry', values.geometry ?? 'chain', ['chain', 'ring'] as const),
      seek: oneOf('seek', values.seek ?? 'any', ['any', 'rise'] as const),
      alpha: levelOf(values.alpha ?? '0.05')
    },
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

function levelOf(value: string): number {
  if (/^(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(value) && Number(value) > 0 && Number(value) < 1)
    return Number(value);
  throw new Refusal([`--alpha takes a level between 0 and 1, such as 0.05, not "${value}".`]);
}
