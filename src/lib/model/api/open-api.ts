import type { z } from 'zod';
import type { Content, Operation } from './operation';
import { OPERATIONS } from './operations';
import { headersOf, LIMITS_TOLD, REFUSALS, refusalsOf } from './refusals';
import { problemJsonSchema, schemaOf, type JsonSchema } from './schemas';

type Json = { [key: string]: unknown };

/** Grows with every change of what is described here; v1 stays in the address as long as old scripts work. */
export const API_VERSION = '1.0.0';

/**
 * The API as an OpenAPI 3.1 document, made from the schemas that the routes themselves read and answer with.
 *
 * @param closed see schemaOf
 */
export function openApi({ closed = false } = {}): Json {
  const paths: Record<string, Json> = {};
  for (const operation of OPERATIONS)
    paths[operation.path] = { ...paths[operation.path], [operation.method]: describe(operation, closed) };
  return {
    openapi: '3.1.1',
    info: {
      title: 'Severalty',
      version: API_VERSION,
      summary: 'Datasets, diagnoses and reports of a team, for its scripts.',
      description:
        'Every request carries a token of the team (made on its page “Scripts”). Moments are ISO 8601 in UTC. Answers may gain fields within v1: leave out what you do not know. Ids of another team are 404.'
    },
    servers: [{ url: '/api/v1' }],
    tags: [...new Set(OPERATIONS.map(({ part }) => part))].map((name) => ({ name })),
    security: [{ token: [] }],
    paths,
    components: {
      securitySchemes: {
        token: {
          type: 'http',
          scheme: 'bearer',
          description: '`Authorization: Bearer sev_…`; cookies count for nothing here.'
        }
      },
      headers: LIMITS_TOLD,
      schemas: { Problem: problemJsonSchema(closed) },
      responses: Object.fromEntries(
        Object.entries(REFUSALS).map(([status, { name, about, headers }]) => [
          name,
          { description: `${status}: ${about}`, headers: headersOf(headers), content: PROBLEM }
        ])
      )
    }
  };
}

const PROBLEM = { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } };

function describe(operation: Operation, closed: boolean): Json {
  const { id, part, summary, about, scope, bodies, bodyIsOptional, answer } = operation;
  return {
    operationId: id,
    tags: [part],
    summary,
    description: [about, `Needs the scope “${scope}”.`].filter(Boolean).join(' '),
    'x-scope': scope,
    parameters: parametersOf(operation),
    ...(bodies
      ? {
          requestBody: {
            required: !bodyIsOptional,
            content: Object.fromEntries(bodies.map((body) => [body.type, contentOf(body, 'input', closed)]))
          }
        }
      : {}),
    responses: {
      [answer.status]: {
        description: answer.about,
        headers: headersOf(answer.location ? ['RateLimit', 'RateLimit-Policy', 'Location'] : undefined),
        content: { [answer.content.type]: contentOf(answer.content, 'output', closed) }
      },
      ...refusalsOf(operation, PROBLEM)
    }
  };
}

function contentOf({ schema, example }: Content, io: 'input' | 'output', closed: boolean): Json {
  return {
    ...(schema ? { schema: schemaOf(schema, io, closed) } : {}),
    ...(example === undefined ? {} : { example })
  };
}

function parametersOf({ idOf, query, once }: Operation): Json[] {
  const list: Json[] = [];
  if (idOf)
    list.push({
      name: 'id',
      in: 'path',
      required: true,
      description: `Id of the ${idOf}`,
      schema: { type: 'string' }
    });
  if (query) for (const one of queryParameters(query)) list.push({ in: 'query', ...one });
  if (once)
    list.push({
      name: 'Idempotency-Key',
      in: 'header',
      required: false,
      description:
        'A name for this request, such as a UUID in quotation marks. Sent again with the same key within 24 hours, it does nothing and gives the first answer.',
      schema: { type: 'string', minLength: 1, maxLength: 202 }
    });
  return list;
}

/** What the query of an address may hold, one entry a parameter. */
export function queryParameters(
  query: z.ZodObject
): { name: string; required: boolean; description?: string; schema: JsonSchema }[] {
  const { properties = {}, required = [] } = schemaOf(query, 'input');
  return Object.entries(properties).map(([name, shape]) => {
    const { description, ...schema } = shape as JsonSchema;
    return { name, required: required.includes(name), ...(description ? { description } : {}), schema };
  });
}
