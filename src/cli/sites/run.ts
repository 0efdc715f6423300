import { readSites } from '$lib/formats/sites/read-sites';
import { sitesReport } from '$lib/stats/sites/sites-report';
import { BadInput } from '$lib/stats/types';
import { type ExitCode, exitCodes, Refusal } from '../shared/exit-codes';
import { inputName } from '../shared/input-name';
import { readInput } from '../shared/read-input';
import { runCommand } from '../shared/run-command';
import { sayProblems } from '../shared/say-problems';
import { help } from './help';
import { type AskedSites, parseArguments } from './parse-arguments';
import { saySites } from './say-sites';

/** Runs `sites` with its arguments, prints, and returns the exit code. */
export const runSites = (args: string[]): Promise<ExitCode> =>
  runCommand({ help, parse: parseArguments, run }, args);

async function run(asked: AskedSites): Promise<ExitCode> {
  const report = await reportOf(asked);
  process.stdout.write(asked.json ? `${JSON.stringify(report)}\n` : saySites(report));
  return exitCodes.done;
}

async function reportOf({ file, options }: AskedSites) {
  const read = readSites(new TextDecoder().decode(await readInput(file)));
  if (!read.ok) throw new Refusal(sayProblems(file, read.problems, read.more));
  try {
    return sitesReport({ names: read.sites, shots: read.shots }, options);
  } catch (error) {
    if (error instanceof BadInput) throw new Refusal([`${inputName(file)}: ${error.reason}`]);
    throw error;
  }
}
