import type { GateRule } from '$lib/stats/versions/types';
import { asksJson, flag, numberOf, readArguments, several, text } from '../shared/arguments';
import { Refusal } from '../shared/exit-codes';

export interface AskedGate {
  files: string[];
  version: string;
  rule: GateRule & { reference: string };
  device: string | null;
  trials: number | null;
  json: boolean;
}

const known = {
  version: text,
  reference: text,
  tolerance: text,
  alpha: text,
  group: several,
  device: text,
  trials: text,
  json: flag,
  text: flag,
  help: flag
} as const;

/**
 * Reads the arguments of `gate`.
 *
 * @throws Refusal that names the option and what it takes
 */
export function parseArguments(args: string[]): AskedGate | 'help' {
  const { values, positionals } = readArguments(args, known);
  if (values.help) return 'help';
  if (positionals.length === 0)
    throw new Refusal([
      'No file is named.',
      'Usage: npm run --silent gate -- FILE... --version V --reference R; --help lists the options.'
    ]);
  const { version, reference } = values;
  if (version === undefined) throw new Refusal(['--version is missing: which firmware version is judged?']);
  if (reference === undefined)
    throw new Refusal(['--reference is missing: which firmware version is it held against?']);
  const alpha = numberOf('alpha', values.alpha ?? '0.05', 'a level between 0 and 1, such as 0.05');
  if (alpha >= 1) throw new Refusal([`--alpha takes a level between 0 and 1, such as 0.05, not "${alpha}".`]);
  return {
    files: positionals,
    version,
    rule: {
      reference,
      tolerance: numberOf('tolerance', values.tolerance ?? '0.1', 'a fraction such as 0.1', 'from-0'),
      alpha,
      groups: values.group ?? null
    },
    device: values.device ?? null,
    trials: values.trials === undefined ? null : numberOf('trials', values.trials, 'a whole number above 0'),
    json: asksJson(values)
  };
}
