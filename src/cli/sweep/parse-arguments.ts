import type { SweepOptions } from '$lib/stats/sweep/types';
import { asksJson, flag, numberOf, oneFile, oneOf, readArguments, text } from '../shared/arguments';
import { Refusal } from '../shared/exit-codes';

export interface AskedSweep {
  file: string;
  options: Omit<SweepOptions, 'timeUnit' | 'window'>;
  from: number | null;
  to: number | null;
  json: boolean;
}

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
  const { values, positionals } = readArguments(args, known);
  if (values.help) return 'help';
  const file = oneFile('sweep', positionals);
  const json = asksJson(values);
  const axis = oneOf('axis', values.axis ?? 'quench', ['quench', 'hold'] as const);
  const [from, to] = (['from', 'to'] as const).map((name) => {
    const value = values[name];
    return value === undefined ? null : numberOf(name, value, 'a time above 0');
  });
  if (from !== null && to !== null && !(to > from))
    throw new Refusal([
      `--from and --to: the window goes from a time above 0 to a later one, not from ${values.from} to ${values.to}.`
    ]);
  return {
    file,
    options: {
      axis: axis === 'quench' ? 'quench-time' : 'hold-time',
      unit: oneOf('unit', values.unit ?? 'defect', ['defect', 'pair'] as const),
      transition: values.transition === undefined ? null : transitionOf(values.transition),
      alpha: levelOf(values.alpha ?? '0.05')
    },
    from,
    to,
    json
  };
}

function levelOf(value: string): number {
  const what = 'a level above 0 and below 0.5, such as 0.05';
  const alpha = numberOf('alpha', value, what);
  if (alpha < 0.5) return alpha;
  throw new Refusal([`--alpha takes ${what}, not "${value}".`]);
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
