import { runDiagnose } from './diagnose/run';

// A reader that stops early (head, a closed pager) is no error of ours.
for (const stream of [process.stdout, process.stderr]) {
  stream.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
    process.exit();
  });
}
// 130 = 128 + SIGINT, as shells say it.
process.once('SIGINT', () => process.exit(130));

process.exitCode = await runDiagnose(process.argv.slice(2));
