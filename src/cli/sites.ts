import { letReadersStop } from './shared/let-readers-stop';
import { runSites } from './sites/run';

/** `npm run sites`. */
letReadersStop();
process.exitCode = await runSites(process.argv.slice(2));
