import { z } from 'zod';
import { problemSchema } from './shapes/problem';

/** A JSON Schema of draft 2020-12, the dialect of OpenAPI 3.1. */
export type JsonSchema = z.core.JSONSchema.BaseSchema;

/**
 * @param closed whether a field that the schema does not name is refused. The served description is open, since v1 may
 *   gain fields and a client generated from it must not break then; the contract test closes it, so that no field goes
 *   out which is not described
 */
export function schemaOf(schema: z.ZodType, io: 'input' | 'output', closed = false): JsonSchema {
  const made = z.toJSONSchema(schema, {
    io,
    override: ({ jsonSchema }) => {
      if (io === 'output' && !closed && jsonSchema.additionalProperties === false)
        delete jsonSchema.additionalProperties;
      // z.int() spells out the whole numbers that JSON keeps exact: every reader has that limit anyway.
      if (jsonSchema.minimum === Number.MIN_SAFE_INTEGER) delete jsonSchema.minimum;
      if (jsonSchema.maximum === Number.MAX_SAFE_INTEGER) delete jsonSchema.maximum;
    }
  });
  delete made.$schema;
  return made;
}

/** Problem details, which every refusal is written in. */
export const problemJsonSchema = (closed = false): JsonSchema => schemaOf(problemSchema, 'output', closed);
