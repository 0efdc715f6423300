import { runSweep } from './sweep/run';

// A reader that stops early (head, a closed pager) is no error of ours.
for (const stream of [process.stdout, process.stderr])
  stream.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
    process.exit();
  });

/** `npm run sweep`. */
process.exitCode = await runSweep(process.argv.slice(2));
