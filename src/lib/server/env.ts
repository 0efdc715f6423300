import { z } from 'zod';

const shape = z.object({
  /** Folder of the database; made when missing. */
  SEVERALTY_DATA: z.string().min(1).default('data'),
  /** 0: any free port. Not set: 4173, or the next free one. */
  PORT: z.coerce.number().int().min(0).max(65535).optional(),
  /** Loopback by default: nobody else on the network sees the counts unless that is asked for. */
  HOST: z.string().min(1).default('127.0.0.1'),
  /** Address that people type, when a proxy stands in front. */
  ORIGIN: z.url({ protocol: /^https?$/ }).optional(),
  /** Bytes of a request body; adapter-node would take 512 kB. */
  BODY_SIZE_LIMIT: z.coerce
    .number()
    .int()
    .min(1)
    .max(2 ** 31)
    .default(20_971_520),
  /** Seconds that open connections get at shutdown; an open event stream would hold it for half a minute. */
  SHUTDOWN_TIMEOUT: z.coerce.number().int().min(0).max(600).default(3),
  /** Set by npm: the script that it runs. */
  npm_lifecycle_event: z.string().optional()
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
  // An empty variable counts as not set.
  const given = Object.fromEntries(Object.entries(source).filter(([, text]) => text !== ''));
  const result = shape.safeParse(given);
  if (result.success) return result.data;
  const lines = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new BadEnvironment(`These environment variables do not fit.\n${lines.join('\n')}`);
}
