/** Why a thread ended without an answer, in words for the person who asked. `memory` in megabytes. */
export function sayFailure(error: unknown, memory: number): string {
  const { code, message } = error instanceof Error ? (error as NodeJS.ErrnoException) : {};
  if (code === 'ERR_WORKER_OUT_OF_MEMORY')
    return `The diagnosis needed more than the ${memory} MB of memory that one may take. Upload the shots summed to a histogram, which needs far less, or run it on the command line.`;
  if (/^worker exited/.test(message ?? ''))
    return 'The thread that ran this diagnosis ended before it was done. Ask for it again; if it happens again, it is a fault of this program.';
  return `The engine stopped with an error: ${message ?? String(error)} This is a fault of this program, not of the data.`;
}
