import type { SitesOptions } from '$lib/stats/sites/sites-types';
import { asksJson, flag, oneFile, oneOf, readArguments, text } from '../shared/arguments';
import { Refusal } from '../shared/exit-codes';

export interface AskedSites {
  file: string;
  options: SitesOptions;
  json: boolean;
}

const known = { geometry: text, seek: text, alpha: text, json: flag, text: flag, help: flag } as const;

/**
 * Reads the arguments of `sites`.
 *
 * @throws Refusal that names the option and what it takes
 */
export function parseArguments(args: string[]): AskedSites | 'help' {
  const { values, positionals } = readArguments(args, known);
  if (values.help) return 'help';
  const file = oneFile('sites', positionals);
  const json = asksJson(values);
  return {
    file,
    options: {
      geometry: oneOf('geometry', values.geometry ?? 'chain', ['chain', 'ring'] as const),
      seek: oneOf('seek', values.seek ?? 'any', ['any', 'rise'] as const),
      alpha: levelOf(values.alpha ?? '0.05')
    },
    json
  };
}

function levelOf(value: string): number {
  if (/^(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(value) && Number(value) > 0 && Number(value) < 1)
    return Number(value);
  throw new Refusal([`--alpha takes a level between 0 and 1, such as 0.05, not "${value}".`]);
}
