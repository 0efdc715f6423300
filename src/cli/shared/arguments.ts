import { parseArgs, type ParseArgsConfig } from 'node:util';
import { Refusal } from './exit-codes';

export const text = { type: 'string' } as const;
export const several = { type: 'string', multiple: true } as const;
export const flag = { type: 'boolean' } as const;

/** Arguments by Node's own reader; an option that is not known is a Refusal in its words. */
export function readArguments<const Known extends NonNullable<ParseArgsConfig['options']>>(
  args: string[],
  options: Known
) {
  try {
    return parseArgs({ args, options, allowPositionals: true, strict: true });
  } catch (error) {
    throw new Refusal([error instanceof Error ? error.message : String(error)]);
  }
}

/** The one file that is named. */
export function oneFile(command: string, files: string[]): string {
  if (files.length === 1) return files[0];
  throw new Refusal([
    files.length === 0 ? 'No file is named.' : `${files.length} files are named; give one.`,
    `Usage: npm run --silent ${command} -- FILE [options]; --help lists the options.`
  ]);
}

/** Whether the document is asked for in place of words. */
export function asksJson({ json = false, text: words = false }: { json?: boolean; text?: boolean }): boolean {
  if (json && words) throw new Refusal(['Both --json and --text are asked for; give one.']);
  return json;
}

/** One of the words that an option takes. */
export function oneOf<T extends string>(name: string, value: string, allowed: readonly T[]): T {
  const found = allowed.find((one) => one === value);
  if (found === undefined) throw new Refusal([`--${name} takes ${allowed.join(' or ')}, not "${value}".`]);
  return found;
}

/** A number that an option takes, above 0 or from 0 on. */
export function numberOf(
  name: string,
  value: string,
  what: string,
  least: 'above-0' | 'from-0' = 'above-0'
): number {
  // Number('') is 0 and Number('0x1') is 1: neither was meant.
  const isNumber = /^(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(value);
  if (isNumber && (Number(value) > 0 || least === 'from-0')) return Number(value);
  throw new Refusal([`--${name} takes ${what}, not "${value}".`]);
}
