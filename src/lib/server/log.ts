import { pino, type Logger } from 'pino';
import { readEnv } from './env';
import { seenRequest } from './running/seen-request';

export type Level = 'debug' | 'info' | 'warn' | 'error';

let logger: Logger | null = null;

/**
 * Writes one line of JSON to standard error, with the id of the request in hand. Addresses never go in whole: the part
 * after `?` can carry somebody's counts, and the path a token (`shownPath`). Nor do names, mail addresses or what was
 * posted.
 */
export function log(level: Level, message: string, details: Record<string, unknown> = {}): void {
  logger ??= pino(
    {
      level: levelOf(),
      base: null,
      messageKey: 'message',
      timestamp: () => `,"time":"${new Date().toISOString()}"`,
      formatters: { level: (level) => ({ level }) },
      mixin: () => ({ request: seenRequest()?.id })
    },
    // Written before this returns, so that the last line before an end is there.
    { write: (line: string) => void process.stderr.write(line) }
  );
  logger[level](details, message);
}

/** A line for each request is for machines: on a terminal it would push away what the start told the person. */
function levelOf(): string {
  return readEnv().LOG_LEVEL ?? (process.stderr.isTTY ? 'warn' : 'info');
}
