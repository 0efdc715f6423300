import { sweepRequestSchema, type SweepRequest } from '$lib/model/team/sweeps/sweep-request';
import { typedNumber } from '$lib/model/team/datasets/typed-number';

const FIELDS = ['name', 'axis', 'from', 'to', 'dimension', 'correlation', 'dynamic', 'alpha'] as const;

/** What was typed, to go back into the form. */
export const typedOfForm = (form: FormData): Record<(typeof FIELDS)[number], string> =>
  Object.fromEntries(FIELDS.map((name) => [name, String(form.get(name) ?? '').trim()])) as Record<
    (typeof FIELDS)[number],
    string
  >;

type Read = { ok: true; request: SweepRequest } | { ok: false; why: string };

/** A sweep as a form asks for it, or what is wrong with it in words. */
export function requestOfForm(form: FormData): Read {
  const typed = typedOfForm(form);
  const datasets = [...new Set(form.getAll('dataset').map(String))];
  if (datasets.length < 2)
    return { ok: false, why: 'Mark at least two datasets, taken with different times.' };
  const numbers = (names: (typeof FIELDS)[number][]) => names.map((name) => typedNumber(typed[name]) ?? NaN);
  const [from, to] = numbers(['from', 'to']);
  if ((typed.from === '') !== (typed.to === ''))
    return { ok: false, why: 'A window has two ends: give both, or leave both empty for all times.' };
  if (typed.from !== '' && !(from > 0 && to > from && to < Infinity))
    return { ok: false, why: 'The window goes from a time above 0 to a later one.' };
  const given = [typed.dimension, typed.correlation, typed.dynamic].filter((text) => text !== '');
  const [dimension, correlation, dynamic] = numbers(['dimension', 'correlation', 'dynamic']);
  if (given.length > 0 && ![dimension, correlation, dynamic].every((one) => one > 0 && one < Infinity))
    return { ok: false, why: 'd, ν and z are three numbers above 0: give all, or none.' };
  const alpha = typed.alpha === '' ? 0.05 : (typedNumber(typed.alpha) ?? NaN);
  if (!(alpha > 0 && alpha < 0.5)) return { ok: false, why: 'The level is above 0 and below 0.5.' };
  const read = sweepRequestSchema.safeParse({
    ...(typed.name ? { name: typed.name } : {}),
    datasets,
    axis: typed.axis,
    window: typed.from === '' ? null : { from, to },
    transition: given.length === 0 ? null : { dimension, correlation, dynamic },
    alpha
  });
  return read.success ? { ok: true, request: read.data } : { ok: false, why: read.error.issues[0].message };
}
