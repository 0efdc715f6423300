import { readingChoicesSchema, type ReadingChoices } from '$lib/model/team/datasets/reading-choices';

/** How a file is to be read, from the fields of a form; what is left to the guess, or is no choice, is left out. */
export function choicesOfForm(data: FormData, prefix: string): ReadingChoices {
  const choices: Record<string, unknown> = {};
  const columns: { column: number; role: string }[] = [];
  for (const [name, value] of data) {
    if (!name.startsWith(prefix) || typeof value !== 'string' || value === '') continue;
    const part = name.slice(prefix.length);
    if (part === 'header') choices.header = value === 'yes';
    else if (part.startsWith('column.')) columns.push({ column: Number(part.slice(7)), role: value });
    else if (part in readingChoicesSchema.shape) choices[part] = value;
  }
  if (columns.length > 0) choices.columns = columns;
  const read = readingChoicesSchema.safeParse(choices);
  return read.success ? read.data : {};
}
