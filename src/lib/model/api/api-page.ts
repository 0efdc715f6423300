import { queryParameters } from './open-api';
import type { Operation } from './operation';
import { OPERATIONS } from './operations';
import { schemaRows, sayKind, type SchemaRow } from './schema-rows';
import { schemaOf } from './schemas';

export interface ShownBody {
  type: string;
  about: string;
  example: string | null;
  rows: SchemaRow[];
}

/** An operation as the page of the API shows it. */
export interface ShownOperation {
  id: string;
  method: string;
  path: string;
  summary: string;
  about: string;
  scope: string;
  once: boolean;
  parameters: SchemaRow[];
  bodies: ShownBody[];
  answer: { status: number; about: string; type: string; rows: SchemaRow[] };
}

/** The page of the API: its operations by part, from the same schemas as the OpenAPI document. */
export function apiPage(): { part: string; operations: ShownOperation[] }[] {
  const parts = [...new Set(OPERATIONS.map(({ part }) => part))];
  return parts.map((part) => ({
    part,
    operations: OPERATIONS.filter((operation) => operation.part === part).map(show)
  }));
}

function show(operation: Operation): ShownOperation {
  const { id, method, path, summary, about = '', scope, once = false, bodies = [], answer } = operation;
  const query = operation.query ? queryParameters(operation.query) : [];
  return {
    id,
    method: method.toUpperCase(),
    path: `/api/v1${path}`,
    summary,
    about,
    scope,
    once,
    parameters: query.map(({ name, description = '', schema }) => ({
      name,
      kind: sayKind(schema),
      about: description
    })),
    bodies: bodies.map(({ type, about, example, schema }) => ({
      type,
      about,
      example: example === undefined ? null : sayExample(example),
      rows: schema ? schemaRows(schemaOf(schema, 'input')) : []
    })),
    answer: {
      status: answer.status,
      about: answer.about,
      type: answer.content.type,
      // The document has a hundred fields and a page of its own in the report: here its kind is enough.
      rows:
        answer.content.schema && id !== 'readDocument'
          ? schemaRows(schemaOf(answer.content.schema, 'output'))
          : []
    }
  };
}

const sayExample = (example: unknown): string =>
  typeof example === 'string' ? example : JSON.stringify(example, null, 2);
