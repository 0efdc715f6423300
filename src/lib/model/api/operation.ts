import type { z } from 'zod';
import type { Scope } from './scopes';

/** A body, sent or answered: JSON of a schema, or a file of another type. */
export interface Content {
  type: string;
  /** Null for text and bytes that no schema describes. */
  schema: z.ZodType | null;
  about: string;
  /** Shown on the page of the API. */
  example?: unknown;
}

/** One operation of the API: what its route does, told to OpenAPI and to the page in one place. */
export interface Operation {
  id: string;
  method: 'get' | 'post' | 'put' | 'delete';
  /** Below /api/v1, as OpenAPI writes it: `/reports/{id}`. */
  path: string;
  part: 'Team' | 'Reports' | 'Datasets' | 'Diagnoses' | 'Sweeps' | 'Maps of sites' | 'Devices' | 'Webhooks';
  /** A verb and its object. */
  summary: string;
  about?: string;
  scope: Scope;
  /** What `{id}` is the id of. */
  idOf?: string;
  query?: z.ZodObject;
  bodies?: Content[];
  /** The body may be left out. */
  bodyIsOptional?: boolean;
  /** Takes Idempotency-Key. */
  once?: boolean;
  answer: { status: 200 | 201 | 202; about: string; content: Content; location?: boolean };
  /** Refusals beyond those that every operation knows. */
  refusals?: Record<number, string>;
}
