import type { CountData, DiagnoseOptions } from '$lib/stats/types';
import { freshSettings, type Settings } from './settings';
import { settingsOfOptions } from './settings-of-options';

/** Longest address part that is written; longer ones get cut by mail programs and chat windows. */
export const LONGEST = 2000;

export interface Address {
  data: CountData;
  settings: Settings;
  name: string | null;
}

const OPTION_NAMES = [
  'trials',
  'unit',
  'geometry',
  'misread',
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

function unrun(text: string): string[] | null {
  const values: string[] = [];
  for (const word of text.split(',')) {
    const [value, times = '1'] = word.split('*');
    const repeats = /^\d{1,5}$/.test(times) ? Number(times) : 0;
    if (repeats < 1) return null;
    for (let i = 0; i < repeats; i++) values.push(decodeURIComponent(value));
  }
  return values;
}

function dataPart(data: CountData): string {
  if (data.kind === 'shots') {
    const shots = `shots=${runs(Array.from(data.shots, String))}`;
    return data.batches ? `${shots}&batches=${runs(data.batches)}` : shots;
  }
  const rows = data.counts.map(([count, shots]) => `${count}:${shots}`);
  if (data.lump) rows.push(`${data.lump.from}+:${data.lump.shots}`);
  return `counts=${rows.join(',')}`;
}

/**
 * The part after `#` that reopens this input: `counts=0:185,1:1149,10+:18&trials=12`. Browsers keep it
 * to themselves, so the counts do not reach a server. Options of a fresh page are left out.
 * @returns null when it would pass {@link LONGEST} characters
 */
export function writeAddress(data: CountData, options: DiagnoseOptions, name: string | null): string | null {
  // Only runs of equal counts make a long list short; a list this long is not worth spelling out to see.
  if (data.kind === 'shots' && data.shots.length > 50 * LONGEST) return null;
  if (options.supplied && options.supplied.length > 50 * LONGEST) return null;
  const fresh = freshSettings();
  const settings = settingsOfOptions(options);
  const parts = [dataPart(data)];
  for (const option of OPTION_NAMES) {
    const same = settings[option] === fresh[option] || (option === 'trials' && options.trials === null);
    if (!same) parts.push(`${option}=${encodeURIComponent(settings[option])}`);
  }
  if (options.supplied) parts.push(`law=${runs(options.supplied.map(String))}`);
  if (name) parts.push(`name=${encodeURIComponent(name)}`);
  const address = parts.join('&');
  return address.length > LONGEST ? null : address;
}

function readCounts(text: string): CountData | null {
  const counts: [number, number][] = [];
  let lump: { from: number; shots: number } | null = null;
  for (const word of text.split(',')) {
    const row = /^(\d+)(\+?):(\d+)$/.exec(word);
    if (!row || lump) return null;
    if (row[2]) lump = { from: Number(row[1]), shots: Number(row[3]) };
    else counts.push([Number(row[1]), Number(row[3])]);
  }
  return { kind: 'histogram', counts, lump };
}

function readShots(shots: string, batches: string | null): CountData | null {
  const values = unrun(shots)?.map((word) => (/^\d+$/.test(word) ? Number(word) : NaN));
  const names = batches === null ? null : unrun(batches);
  if (!values || values.some(Number.isNaN) || (batches !== null && names?.length !== values.length))
    return null;
  return { kind: 'shots', shots: values, batches: names };
}

/** Reads what {@link writeAddress} wrote; null for any other text, so that a cut address opens an empty page. */
export function readAddress(fragment: string): Address | null {
  const parts = new Map<string, string>();
  for (const part of fragment.replace(/^#/, '').split('&')) {
    const cut = part.indexOf('=');
    if (cut > 0) parts.set(part.slice(0, cut), part.slice(cut + 1));
  }
  try {
    const counts = parts.get('counts');
    const shots = parts.get('shots');
    const data = counts ? readCounts(counts) : shots ? readShots(shots, parts.get('batches') ?? null) : null;
    if (!data) return null;
    const settings = freshSettings();
    for (const option of OPTION_NAMES) {
      const value = parts.get(option);
      if (value !== undefined) Object.assign(settings, { [option]: decodeURIComponent(value) });
    }
    settings.supplied = unrun(parts.get('law') ?? '')?.join(' ') ?? '';
    const name = parts.get('name');
    const known = ['defect', 'pair'].includes(settings.unit);
    const placed = ['sites', 'open-bonds', 'ring-bonds'].includes(settings.geometry);
    return known && placed ? { data, settings, name: name ? decodeURIComponent(name) : null } : null;
  } catch {
    // decodeURIComponent throws on a cut escape.
    return null;
  }
}
