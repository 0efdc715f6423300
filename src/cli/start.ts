import { databaseFile, openDatabase } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';
import { isLocal, readEnv } from '$lib/server/env';
import { SECURITY_HEADERS, STRICT_TRANSPORT } from '$lib/server/handles/security-headers';
import { projectFolder } from '$lib/server/project-folder';
import { demoPeopleOf } from '$lib/server/services/demo-team/demo-people-of';
import { seedDemoTeam } from '$lib/server/services/demo-team/seed-demo-team';
import { seedSamples } from '$lib/server/services/seed-samples';
import { createServer, type RequestListener } from 'node:http';
import { join, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { demoWords } from './start/demo-words';
import { listen } from './start/listen';
import { nameOrigin } from './start/name-origin';
import { refuseForm } from './start/refuse-form';
import { seeRequests } from './start/see-requests';
import { stopCleanly } from './start/stop-cleanly';

/** `npm start`: makes the database ready, serves the built application, and says where. */
async function start(): Promise<void> {
  const env = readEnv();
  const folder = resolve(env.SEVERALTY_DATA);

  // Done here as well as in the server's own `init`, so that trouble with the data is told in one line.
  const db = openDatabase(databaseFile(folder));
  migrateDatabase(db);
  seedSamples(db);
  const demo = isLocal(env) && env.SEVERALTY_DEMO === 'yes';
  if (demo) await seedDemoTeam(db);
  const demoPeople = demo ? demoPeopleOf(db) : [];
  db.$client.close();

  // Listening comes first: the server must know its own address (ORIGIN) before it is loaded, and a port
  // that was only found free may be taken a moment later.
  let answer: RequestListener = (_request, response) =>
    void response.writeHead(503, { 'retry-after': '1' }).end();
  const server = createServer(
    seeRequests((request, response) => answer(request, response), env.ADDRESS_HEADER !== undefined)
  );
  const port = await listen(server, env.HOST, env.PORT);
  const address = env.ORIGIN ?? `http://${nameOf(env.HOST)}:${port}`;
  stopCleanly(server, env.SHUTDOWN_TIMEOUT, env.npm_lifecycle_event === 'start');

  process.env.ORIGIN = address;
  // Auth.js would take the Host header for its own address, and that is the client's to write.
  process.env.AUTH_URL = address;
  process.env.SEVERALTY_DATA = folder;
  process.env.BODY_SIZE_LIMIT = String(env.BODY_SIZE_LIMIT);
  const built = pathToFileURL(join(projectFolder(), 'build', 'handler.js')).href;
  const { handler } = (await import(/* @vite-ignore */ built)) as { handler: RequestListener };
  const headers = address.startsWith('https:')
    ? { ...SECURITY_HEADERS, ...STRICT_TRANSPORT }
    : SECURITY_HEADERS;
  answer = (request, response) => {
    for (const [name, value] of Object.entries(headers)) response.setHeader(name, value);
    nameOrigin(request, address);
    if (!refuseForm(request, response)) handler(request, response);
  };

  console.log(`
Severalty is ready at ${address}

Open that address in a browser. Take an example beside the form, or drop a histogram of your own on it:
the counts are worked on in the browser and sent nowhere. The application keeps its data in
${folder}
${mailLine(address)}
${demoWords(address, demoPeople)}Press Ctrl+C to stop.
`);
}

/** Where mail goes: the one thing that nobody would guess. */
function mailLine(address: string): string {
  const env = readEnv();
  if (env.SMTP_URL) return `Mail goes out through ${new URL(env.SMTP_URL).host}.`;
  if (isLocal(env)) return `Mail is not sent but shown at ${address}/outbox, to this machine alone.`;
  return 'No mail can be sent: SMTP_URL is not set. Mailed links and invitations do not work.';
}

/** What to type into a browser for an address that is listened on. */
function nameOf(host: string): string {
  if (['127.0.0.1', '::1', '0.0.0.0', '::', 'localhost'].includes(host)) return 'localhost';
  return host.includes(':') ? `[${host}]` : host;
}

start().catch((error: unknown) => {
  const text = error instanceof Error ? error.message : String(error);
  console.error(`severalty: ${text}`);
  process.exit(1);
});
