import { z } from 'zod';

/** A whole number from text; an empty variable counts as not set. */
const whole = (fallback: number, low: number, high: number) =>
  z.preprocess(
    (text) => (text === '' ? undefined : text),
    z.coerce.number().int().min(low).max(high).default(fallback)
  );

const shape = z.object({
  /** Folder of the database; made when missing. */
  SEVERALTY_DATA: z.string().min(1).default('data'),
  /** 0: any free port. Not set: 4173, or the next free one. */
  PORT: z.preprocess(
    (text) => (text === '' ? undefined : text),
    z.coerce.number().int().min(0).max(65535).optional()
  ),
  /** Loopback by default: nobody else on the network sees the counts unless that is asked for. */
  HOST: z.string().min(1).default('127.0.0.1'),
  /** Address that people type, when a proxy stands in front. */
  ORIGIN: z.url({ protocol: /^https?$/ }).optional(),
  /** Bytes of a request body; adapter-node would take 512 kB. */
  BODY_SIZE_LIMIT: whole(20_971_520, 1, 2 ** 31),
  /** Seconds that open connections get at shutdown; an open event stream would hold it for half a minute. */
  SHUTDOWN_TIMEOUT: whole(3, 0, 600)
});

export type Env = z.infer<typeof shape>;

/** The environment is wrong: which variable, and why, in plain words. */
export class BadEnvironment extends Error {
  override readonly name = 'BadEnvironment';
}

/**
 * The settings of this process, checked. The only place that reads the environment.
 *
 * @param source the environment; `process.env` unless a test says otherwise
 * @throws BadEnvironment naming each variable that does not fit
 */
export function readEnv(source: Record<string, string | undefined> = process.env): Env {
  const result = shape.safeParse(source);
  if (result.success) return result.data;
  const lines = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new BadEnvironment(`These environment variables do not fit.\n${lines.join('\n')}`);
}
