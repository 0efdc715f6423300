/** A reader that stops early (head, a closed pager) is no error of ours. */
export function letReadersStop(): void {
  for (const stream of [process.stdout, process.stderr])
    stream.on('error', (error: NodeJS.ErrnoException) => {
      if (error.code !== 'EPIPE') throw error;
      process.exit();
    });
}
