import { unturned } from '$lib/model/unturned';
import { z } from 'zod';
import { readKept, writeKept } from '../../read-kept';
import { SETTING_WORDS } from '../../setting-words';

export const GEOMETRY_VALUES = ['sites', 'open-bonds', 'ring-bonds'] as const;
export const UNIT_VALUES = ['defect', 'pair'] as const;

/** Longest text of each field, in characters. */
export const LENGTHS = {
  name: 200,
  device: 100,
  firmware: 100,
  group: 100,
  quenchUnit: 20,
  holdUnit: 20,
  trialsWhy: 500,
  postSelection: 1000,
  notes: 5000
} as const;

const text = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `Write at most ${most} characters.`)
    .transform((typed) => unturned(typed).trim() || null)
    .nullable();
const time = z
  .number()
  .min(0, 'A time is 0 or more.')
  .max(1e15, 'Write the time in a larger unit.')
  .nullable();

/** Counts kept, written as readKept reads them: whatever dash was typed, one way of writing is kept. */
const kept = z
  .string()
  .trim()
  .refine((typed) => typed === '' || readKept(typed) !== null, SETTING_WORDS.kept)
  .transform((typed) => {
    const read = readKept(typed);
    return read && writeKept(read);
  })
  .nullable();

/** Whether a text is a day that exists, as YYYY-MM-DD. */
export function isDay(day: string): boolean {
  if (!/^\d{4}-\d\d-\d\d$/.test(day)) return false;
  const at = new Date(`${day}T00:00:00Z`);
  return !Number.isNaN(at.getTime()) && at.toISOString().startsWith(day);
}

/** What a person says about a dataset: its name and the conditions it was taken under. Null: not stated. */
export const conditionsSchema = z.strictObject({
  name: z
    .string()
    .transform((typed) => unturned(typed).trim())
    .pipe(
      z
        .string()
        .min(1, 'Give the dataset a name.')
        .max(LENGTHS.name, `Write at most ${LENGTHS.name} characters.`)
    ),
  device: text(LENGTHS.device),
  firmware: text(LENGTHS.firmware),
  group: text(LENGTHS.group),
  quenchTime: time,
  quenchUnit: text(LENGTHS.quenchUnit),
  holdTime: time,
  holdUnit: text(LENGTHS.holdUnit),
  geometry: z.enum(GEOMETRY_VALUES),
  unit: z.enum(UNIT_VALUES),
  trials: z.number().int().min(1).max(1e9).nullable(),
  trialsWhy: text(LENGTHS.trialsWhy),
  misread: z.number().min(0, SETTING_WORDS.misread).lt(0.5, SETTING_WORDS.misread).nullable(),
  misreadUncertainty: z
    .number()
    .min(0, SETTING_WORDS.misreadUncertainty)
    .lt(0.5, SETTING_WORDS.misreadUncertainty)
    .nullable(),
  kept,
  postSelection: text(LENGTHS.postSelection),
  measuredOn: z
    .string()
    .refine(isDay, 'Write a day that exists as year-month-day, such as 2026-03-14.')
    .nullable(),
  notes: text(LENGTHS.notes)
});

export type Conditions = z.infer<typeof conditionsSchema>;
export type ConditionName = keyof Conditions;
export const CONDITION_NAMES = Object.keys(conditionsSchema.shape) as ConditionName[];

/** Conditions of a dataset about which nothing is stated. */
export function bareConditions(name: string): Conditions {
  return {
    name,
    device: null,
    firmware: null,
    group: null,
    quenchTime: null,
    quenchUnit: null,
    holdTime: null,
    holdUnit: null,
    geometry: 'sites',
    unit: 'defect',
    trials: null,
    trialsWhy: null,
    misread: null,
    misreadUncertainty: null,
    kept: null,
    postSelection: null,
    measuredOn: null,
    notes: null
  };
}
