import type { Server } from 'node:http';

/**
 * At SIGTERM or SIGINT: takes no new connections, lets requests in hand end for `seconds`, then cuts them,
 * tells Kit (`sveltekit:shutdown` closes the database) and lets the process end by itself. A second signal
 * ends it at once.
 *
 * @param underNpm started by `npm start`: npm hands a SIGTERM to its shell, which dies of it without telling
 *   us, so a parent that is gone counts as the signal. Not otherwise: a server may outlive who started it.
 */
export function stopCleanly(server: Server, seconds: number, underNpm: boolean): void {
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
  const parent = process.ppid;
  if (underNpm) {
    setInterval(() => {
      if (!stopping && process.ppid !== parent) stop('SIGTERM');
    }, 300).unref();
  }
}
