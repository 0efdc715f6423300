import type { CountData, DiagnoseOptions } from '$lib/stats/types';
import { freshSettings } from './settings';
import { settingsOfOptions } from './settings-of-options';

/** Longest address part that is written; longer ones get cut by mail programs and chat windows. */
export const LONGEST = 2000;

/** Most shots, batches or probabilities that an address spells out one by one. */
export const MOST = 50 * LONGEST;

export const OPTION_NAMES = [
  'trials',
  'unit',
  'geometry',
  'misread',
  'misreadUncertainty',
  'kept',
  'alpha',
  'tolerance',
  'resamples',
  'seed'
] as const;

/** `a*3,b` for a, a, a, b. */
function runs(values: string[]): string {
  const words: string[] = [];
  for (let i = 0; i < values.length;) {
    let end = i + 1;
    while (end < values.length && values[end] === values[i]) end++;
    const word = encodeURIComponent(values[i]).replaceAll('*', '%2A');
    words.push(end - i > 1 ? `${word}*${end - i}` : word);
    i = end;
  }
  return words.join(',');
}

/** The number of shots that `sum` states. */
export const shotsOf = (data: CountData): number =>
  data.kind === 'shots'
    ? data.shots.length
    : data.counts.reduce((sum, [, shots]) => sum + shots, (data.lump?.shots ?? 0) + (data.below?.shots ?? 0));

function dataPart(data: CountData): string {
  if (data.kind === 'shots') {
    const shots = `shots=${runs(Array.from(data.shots, String))}`;
    return data.batches ? `${shots}&batches=${runs(data.batches)}` : shots;
  }
  const rows = data.counts.map(([count, shots]) => `${count}:${shots}`);
  if (data.below) rows.unshift(`0-${data.below.to}:${data.below.shots}`);
  if (data.lump) rows.push(`${data.lump.from}+:${data.lump.shots}`);
  return `counts=${rows.join(',')}`;
}

/**
 * The part after `#` that reopens this input: `counts=0:185,1:1149,10+:18&trials=12&sum=1352`. Browsers keep it
 * to themselves, so the counts do not reach a server. Options of a fresh page are left out.
 * The number of shots stands last, so that an address that was cut off shows it.
 * @returns null when it would pass {@link LONGEST} characters
 */
export function writeAddress(data: CountData, options: DiagnoseOptions, name: string | null): string | null {
  // Only runs of equal counts make a long list short; a list this long is not worth spelling out to see.
  if (data.kind === 'shots' && data.shots.length > MOST) return null;
  if (options.supplied && options.supplied.length > MOST) return null;
  const fresh = freshSettings();
  const settings = settingsOfOptions(options);
  const parts = [dataPart(data)];
  for (const option of OPTION_NAMES) {
    const same = settings[option] === fresh[option] || (option === 'trials' && options.trials === null);
    if (!same) parts.push(`${option}=${encodeURIComponent(settings[option])}`);
  }
  if (options.supplied) parts.push(`law=${runs(options.supplied.map(String))}`);
  if (name) parts.push(`name=${encodeURIComponent(name)}`);
  parts.push(`sum=${shotsOf(data)}`);
  const address = parts.join('&');
  return address.length > LONGEST ? null : address;
}
