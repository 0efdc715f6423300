import { z } from 'zod';
import { CONDITION_NAMES, type ConditionName, type Conditions } from './conditions';
import { readTypedConditions } from './read-typed-conditions';

/** The fields of a form of conditions, as typed: a wrong entry stays where it is. */
export type TypedConditions = Record<ConditionName, string>;

/** Conditions as they stand in the fields of a form. */
export function typedConditions(conditions: Conditions): TypedConditions {
  const typed = CONDITION_NAMES.map((name) => [
    name,
    conditions[name] === null ? '' : String(conditions[name])
  ]);
  return Object.fromEntries(typed) as TypedConditions;
}

const texts = Object.fromEntries(CONDITION_NAMES.map((name) => [name, z.string().default('')])) as Record<
  ConditionName,
  z.ZodDefault<z.ZodString>
>;

/** Form of one dataset's conditions: each problem at its field, what was typed untouched. */
export const typedConditionsSchema = z.object(texts).superRefine((typed, context) => {
  const read = readTypedConditions(typed);
  if (read.ok) return;
  for (const [name, message] of Object.entries(read.problems))
    context.addIssue({ code: 'custom', path: [name], message });
});
