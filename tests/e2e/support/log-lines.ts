import type { RunningServer } from './start-server';

/** One line of the log. */
export type LogLine = Record<string, unknown> & { level: string; message: string; time: string };

/** What the server has logged: the lines of its output that are JSON. */
export function logLines(server: Pick<RunningServer, 'output'>): LogLine[] {
  return server
    .output()
    .split('\n')
    .filter((line) => line.startsWith('{'))
    .map((line) => JSON.parse(line) as LogLine);
}
