import { fileURLToPath } from 'node:url';
import { isMainThread } from 'node:worker_threads';
import { compileLater } from './shared/compile-later';
import { letReadersStop } from './shared/let-readers-stop';
import { serveDraws } from './shared/second-thread';

/** `npm run diagnose`; also the script of its second thread, which needs no more than the engine. */
if (isMainThread) {
  compileLater();
  await main();
} else serveDraws();

async function main(): Promise<void> {
  letReadersStop();
  // 130 = 128 + SIGINT, as shells say it.
  process.once('SIGINT', () => process.exit(130));

  const { runDiagnose } = await import('./diagnose/run');
  process.exitCode = await runDiagnose(process.argv.slice(2), fileURLToPath(import.meta.url));
}
