import type { Server } from 'node:http';

/**
 * At SIGTERM or SIGINT: takes no new connections, lets requests in hand end for `seconds`, then cuts them,
 * tells Kit (`sveltekit:shutdown` closes the database) and lets the process end by itself. A second signal
 * ends it at once.
 */
export function stopCleanly(server: Server, seconds: number): void {
  let stopping = false;
  const stop = (signal: NodeJS.Signals) => {
    if (stopping) process.exit(1);
    stopping = true;
    server.close(() => {
      clearTimeout(limit);
      // Kit's own event: process has no type for it.
      (process as NodeJS.EventEmitter).emit('sveltekit:shutdown', signal);
      // Something may still hold the loop (a worker); the database is closed, so nothing is lost.
      setTimeout(() => process.exit(0), 500).unref();
    });
    server.closeIdleConnections();
    const limit = setTimeout(() => server.closeAllConnections(), seconds * 1000);
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
}
