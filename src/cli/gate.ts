import { runGate } from './gate/run';
import { letReadersStop } from './shared/let-readers-stop';

/** `npm run gate`. */
letReadersStop();
process.exitCode = await runGate(process.argv.slice(2));
