import { runSites } from './sites/run';

// A reader that stops early (head, a closed pager) is no error of ours.
for (const stream of [process.stdout, process.stderr])
  stream.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
    process.exit();
  });

/** `npm run sites`. */
process.exitCode = await runSites(process.argv.slice(2));
