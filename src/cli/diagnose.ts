import { fileURLToPath } from 'node:url';
import { isMainThread } from 'node:worker_threads';
import { compileLater } from './shared/compile-later';
import { serveDraws } from './shared/second-thread';

/** `npm run diagnose`; also the script of its second thread, which needs no more than the engine. */
if (isMainThread) {
  compileLater();
  await main();
} else serveDraws();

async function main(): Promise<void> {
  // A reader that stops early (head, a closed pager) is no error of ours.
  for (const stream of [process.stdout, process.stderr]) {
    stream.on('error', (error: NodeJS.ErrnoException) => {
      if (error.code !== 'EPIPE') throw error;
      process.exit();
    });
  }
  // 130 = 128 + SIGINT, as shells say it.
  process.once('SIGINT', () => process.exit(130));

  const { runDiagnose } = await import('./diagnose/run');
  process.exitCode = await runDiagnose(process.argv.slice(2), fileURLToPath(import.meta.url));
}
