import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';

/** First port tried when none is asked for, and how many after it. */
const FIRST = 4173;
const TRIES = 50;

/**
 * Listens on the port asked for, or on the first free one from 4173 on.
 *
 * @param asked 0 for any free port, undefined for the search
 * @returns the port
 * @throws with plain words when the port is taken or not allowed
 */
export async function listen(server: Server, host: string, asked: number | undefined): Promise<number> {
  if (asked !== undefined) {
    if (await tryPort(server, host, asked)) return (server.address() as AddressInfo).port;
    throw new Error(`Port ${asked} is already in use. Stop the program that uses it, or give another PORT.`);
  }
  for (let port = FIRST; port < FIRST + TRIES; port++) if (await tryPort(server, host, port)) return port;
  throw new Error(`Ports ${FIRST} to ${FIRST + TRIES - 1} are all in use. Give another one in PORT.`);
}

/** False when another program has the port. */
function tryPort(server: Server, host: string, port: number): Promise<boolean> {
  return new Promise((resolve, reject) => {
    const refused = (error: NodeJS.ErrnoException) => {
      if (error.code === 'EADDRINUSE') resolve(false);
      else if (error.code === 'EACCES')
        reject(new Error(`This user may not use port ${port}. Give a PORT above 1023.`));
      else reject(new Error(`Cannot listen on ${host}, port ${port}: ${error.message}`));
    };
    server.once('error', refused);
    server.listen({ host, port }, () => {
      server.off('error', refused);
      resolve(true);
    });
  });
}
