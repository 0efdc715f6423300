import type { JsonSchema } from './schemas';

/** A field for a table: its name with dots for what lies within, what it holds, and what it means. */
export interface SchemaRow {
  name: string;
  kind: string;
  about: string;
}

/** The fields of an object schema, those within included; of a list its entries, as `data[].id`. */
export function schemaRows(schema: JsonSchema, before = ''): SchemaRow[] {
  return Object.entries(schema.properties ?? {}).flatMap(([name, shape]) => {
    const field = shape as JsonSchema;
    const own = { name: before + name, kind: sayKind(field), about: field.description ?? '' };
    const inner = innerOf(field);
    return [own, ...(inner ? schemaRows(inner.schema, `${before}${name}${inner.list ? '[]' : ''}.`) : [])];
  });
}

function innerOf(schema: JsonSchema): { schema: JsonSchema; list: boolean } | null {
  if (schema.properties) return { schema, list: false };
  const choice = alternatives(schema).find(({ properties }) => properties);
  if (choice) return { schema: choice, list: false };
  const items = schema.items as JsonSchema | undefined;
  return items && typeof items === 'object' && items.properties ? { schema: items, list: true } : null;
}

const alternatives = (schema: JsonSchema): JsonSchema[] => (schema.anyOf ?? []) as JsonSchema[];

/** What a field holds, in words: `whole number from 1 to 200`, `text or null`, `one of lead, observer`. */
export function sayKind(schema: JsonSchema): string {
  const choices = alternatives(schema);
  if (choices.length > 0) return [...new Set(choices.map(sayKind))].join(' or ');
  if (schema.const !== undefined) return `“${String(schema.const)}”`;
  if (schema.enum) return `one of ${schema.enum.map(String).join(', ')}`;
  if (Array.isArray(schema.type)) return schema.type.map((type) => KINDS[type] ?? type).join(' or ');
  if (schema.type === 'array') return sayList(schema);
  const kind = KINDS[schema.type ?? ''] ?? 'anything';
  return `${schema.format === 'date-time' ? 'moment' : kind}${sayRange(schema)}`;
}

function sayList(schema: JsonSchema): string {
  if (schema.prefixItems) return `[${(schema.prefixItems as JsonSchema[]).map(sayKind).join(', ')}]`;
  return `list of ${sayKind((schema.items ?? {}) as JsonSchema)}`;
}

function sayRange({ minimum, maximum, exclusiveMaximum, maxLength }: JsonSchema): string {
  if (maxLength !== undefined) return `, at most ${maxLength} characters`;
  const top = maximum ?? exclusiveMaximum;
  if (minimum !== undefined && top !== undefined)
    return ` from ${minimum} to ${exclusiveMaximum === undefined ? '' : 'below '}${top}`;
  return minimum !== undefined ? ` from ${minimum}` : '';
}

const KINDS: Record<string, string> = {
  string: 'text',
  number: 'number',
  integer: 'whole number',
  boolean: 'yes or no',
  object: 'object',
  null: 'null'
};
