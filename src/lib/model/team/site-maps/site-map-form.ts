import { unturned } from '../../unturned';
import { LENGTHS } from '../datasets/conditions';
import { typedNumber } from '../datasets/typed-number';

/** Fields of the form that makes a map of sites, in their order. */
export const MAP_FIELDS = [
  'name',
  'geometry',
  'seek',
  'alpha',
  'device',
  'firmware',
  'group',
  'kinks'
] as const;
export type MapField = (typeof MAP_FIELDS)[number];
export type TypedMap = Record<MapField, string>;

/** Longest texts, in characters: a name leaves room for what is added for the dataset of its counts. */
export const MAP_LENGTHS = {
  name: 180,
  device: LENGTHS.device,
  firmware: LENGTHS.firmware,
  group: 100
} as const;

export interface MapFields {
  /** Null: not given. */
  name: string | null;
  geometry: 'chain' | 'ring';
  seek: 'any' | 'rise';
  alpha: number;
  device: string | null;
  firmware: string | null;
  group: string | null;
  keepsKinks: boolean;
}

export type ReadMapForm =
  { ok: true; fields: MapFields } | { ok: false; problems: Partial<Record<MapField, string>> };

/** What a form says about site-resolved shots, or what is wrong with it, field by field. */
export function readMapForm(typed: TypedMap): ReadMapForm {
  const problems: Partial<Record<MapField, string>> = {};
  const text = (field: keyof typeof MAP_LENGTHS): string | null => {
    const said = unturned(typed[field]).trim();
    if (said.length > MAP_LENGTHS[field]) problems[field] = `Write at most ${MAP_LENGTHS[field]} characters.`;
    return said || null;
  };
  const alpha = typed.alpha.trim() === '' ? 0.05 : (typedNumber(typed.alpha) ?? NaN);
  if (!(alpha > 0 && alpha < 1)) problems.alpha = 'The level is a number above 0 and below 1, such as 0.05.';
  const { geometry, seek } = typed;
  if (geometry !== 'chain' && geometry !== 'ring')
    problems.geometry = 'Say whether the sites form a chain or a ring.';
  if (seek !== 'any' && seek !== 'rise') problems.seek = 'Say what is looked for.';
  const [name, device, firmware, group] = (['name', 'device', 'firmware', 'group'] as const).map(text);
  if (firmware !== null && device === null)
    problems.device = 'A firmware version needs the device it runs on.';
  if (Object.keys(problems).length > 0) return { ok: false, problems };
  return {
    ok: true,
    fields: {
      name,
      geometry: geometry === 'ring' ? 'ring' : 'chain',
      seek: seek === 'rise' ? 'rise' : 'any',
      alpha,
      device,
      firmware,
      group,
      keepsKinks: typed.kinks === 'keep'
    }
  };
}
