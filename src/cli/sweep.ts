import { letReadersStop } from './shared/let-readers-stop';
import { runSweep } from './sweep/run';

/** `npm run sweep`. */
letReadersStop();
process.exitCode = await runSweep(process.argv.slice(2));
