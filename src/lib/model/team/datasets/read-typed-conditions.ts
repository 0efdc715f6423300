import { SETTING_WORDS } from '../../setting-words';
import { conditionsSchema, type ConditionName, type Conditions } from './conditions';
import { typedNumber } from './typed-number';

export type ConditionProblems = Partial<Record<ConditionName, string>>;
export type TypedRead = { ok: true; conditions: Conditions } | { ok: false; problems: ConditionProblems };

const numbers: Partial<Record<ConditionName, string>> = {
  quenchTime: 'Write a time as a number, such as 2.5; its unit has a field of its own.',
  holdTime: 'Write a time as a number, such as 2.5; its unit has a field of its own.',
  trials: 'Write a whole number from 1 to 1 000 000 000, or leave it empty.',
  misread: SETTING_WORDS.misread,
  misreadUncertainty: SETTING_WORDS.misreadUncertainty
};

/**
 * Conditions from the texts of a form; a field that is empty is not stated.
 *
 * @returns the conditions, or what is wrong with each field
 */
export function readTypedConditions(typed: Partial<Record<ConditionName, string>>): TypedRead {
  const problems: ConditionProblems = {};
  const values: Record<string, unknown> = {};
  for (const name of Object.keys(conditionsSchema.shape) as ConditionName[]) {
    const text = (typed[name] ?? '').trim();
    if (name === 'name' || name === 'geometry' || name === 'unit') values[name] = text;
    else if (text === '' || (name === 'trials' && text.toLowerCase() === 'unknown')) values[name] = null;
    else if (name in numbers) values[name] = typedNumber(text) ?? NaN;
    else values[name] = text;
  }
  const read = conditionsSchema.safeParse(values);
  if (read.success) return { ok: true, conditions: read.data };
  for (const { path, message } of read.error.issues) {
    const name = path[0] as ConditionName;
    problems[name] ??= numbers[name] ?? message;
  }
  return { ok: false, problems };
}
