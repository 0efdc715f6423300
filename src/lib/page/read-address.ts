import type { CountData, Histogram } from '$lib/stats/types';
import { MOST, OPTION_NAMES, shotsOf } from './address';
import { freshSettings, type Settings } from './settings';

export interface Address {
  data: CountData;
  settings: Settings;
  name: string | null;
  /** Whether it states its number of shots. One written by hand, or cut off, does not. */
  whole: boolean;
}

export type AddressRead = { ok: true; address: Address } | { ok: false; problem: string };

/** Twice what is written: an address may have been escaped once more on its way. */
const LONGEST_READ = 4000;

const KNOWN = new Set<string>(['counts', 'shots', 'batches', 'law', 'name', 'sum', 'at', ...OPTION_NAMES]);
const UNITS = ['defect', 'pair'];
const GEOMETRIES = ['sites', 'open-bonds', 'ring-bonds'];

/** Carries the part that cannot be read. */
class Unreadable extends Error {}

/**
 * Reads what `writeAddress` wrote.
 * @returns what is wrong, with the part that it is about, for any other text; nothing is ever left out in silence
 */
export function readAddress(fragment: string): AddressRead {
  const text = fragment.replace(/^#/, '');
  if (text.length > LONGEST_READ) return refused(`it has more than ${LONGEST_READ} characters`);
  try {
    const parts = partsOf(text);
    const data = dataOf(parts);
    const sum = parts.get('sum');
    if (sum !== undefined && sum !== String(shotsOf(data)))
      return {
        ok: false,
        problem: `This address was cut off or changed: it states ${shortened(sum)} shots and carries ${shotsOf(data)}.`
      };
    const settings = settingsOf(parts);
    return {
      ok: true,
      address: { data, settings, name: parts.get('name') || null, whole: sum !== undefined }
    };
  } catch (error) {
    if (error instanceof Unreadable) return refused(error.message);
    throw error;
  }
}

const refused = (why: string): AddressRead => ({
  ok: false,
  problem: `This address could not be read: ${why}.`
});

const shortened = (text: string): string => (text.length > 40 ? `${text.slice(0, 40)}…` : text);

const unreadable = (part: string): Unreadable => new Unreadable(`“${shortened(part)}” is not understood`);

/** Parts by name. Lists stay escaped, since their separators may stand escaped in their words. */
function partsOf(text: string): Map<string, string> {
  const parts = new Map<string, string>();
  for (const part of text.split('&')) {
    const cut = part.indexOf('=');
    const name = part.slice(0, Math.max(0, cut));
    if (!KNOWN.has(name) || parts.has(name)) throw unreadable(part);
    const value = part.slice(cut + 1);
    parts.set(name, ['counts', 'shots', 'batches', 'law'].includes(name) ? value : decoded(value, part));
  }
  return parts;
}

/** decodeURIComponent throws on a cut escape. */
function decoded(text: string, part: string): string {
  try {
    return decodeURIComponent(text);
  } catch {
    throw unreadable(part);
  }
}

/** Lists `a*3,b` as a, a, a, b; never more than {@link MOST}, which would hold up the page. */
function unrun(text: string, part: string): string[] {
  const values: string[] = [];
  for (const word of text.split(',')) {
    const [value, times = '1', ...rest] = word.split('*');
    const repeats = /^\d{1,6}$/.test(times) && !rest.length ? Number(times) : 0;
    if (repeats < 1) throw unreadable(part);
    if (values.length + repeats > MOST) throw new Unreadable(`“${part}” lists more than ${MOST} entries`);
    const one = decoded(value, part);
    for (let i = 0; i < repeats; i++) values.push(one);
  }
  return values;
}

/** A whole number that is held exactly. */
function whole(text: string, part: string): number {
  const value = /^\d+$/.test(text) ? Number(text) : NaN;
  if (!Number.isSafeInteger(value)) throw unreadable(part);
  return value;
}

function dataOf(parts: Map<string, string>): CountData {
  const counts = parts.get('counts');
  const shots = parts.get('shots');
  if (counts !== undefined && shots === undefined && !parts.has('batches')) return histogramOf(counts);
  if (counts !== undefined) throw new Unreadable('it carries both “counts” and “shots”');
  if (shots === undefined) throw new Unreadable('it carries no counts');
  const values = unrun(shots, 'shots').map((word) => whole(word, `shots: ${word}`));
  const batches = parts.get('batches');
  const names = batches === undefined ? null : unrun(batches, 'batches');
  if (names && names.length !== values.length)
    throw new Unreadable(`“batches” names ${names.length} shots of ${values.length}`);
  return { kind: 'shots', shots: values, batches: names };
}

function histogramOf(text: string): CountData {
  const counts: [number, number][] = [];
  let lump: Histogram['lump'] = null;
  let below: Histogram['below'] = null;
  for (const word of text.split(',')) {
    const part = `counts=${word}`;
    const row = /^(0-)?(\d+)(\+?):(\d+)$/.exec(word);
    if (!row || lump || (row[1] && (row[3] || below || counts.length > 0))) throw unreadable(part);
    const [count, shots] = [whole(row[2], part), whole(row[4], part)];
    if (row[1]) below = { to: count, shots };
    else if (row[3]) lump = { from: count, shots };
    else counts.push([count, shots]);
  }
  return { kind: 'histogram', counts, lump, ...(below && { below }) };
}

function settingsOf(parts: Map<string, string>): Settings {
  const settings = freshSettings();
  for (const option of OPTION_NAMES) {
    const value = parts.get(option);
    if (value !== undefined) Object.assign(settings, { [option]: value });
  }
  if (!UNITS.includes(settings.unit)) throw unreadable(`unit=${settings.unit}`);
  if (!GEOMETRIES.includes(settings.geometry)) throw unreadable(`geometry=${settings.geometry}`);
  const law = parts.get('law');
  if (law !== undefined) settings.supplied = unrun(law, 'law').join(' ');
  return settings;
}
