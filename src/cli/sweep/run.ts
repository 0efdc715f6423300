import { readCounts } from '$lib/formats/read-counts';
import { sweepReport } from '$lib/stats/sweep/sweep-report';
import type { SweepReport } from '$lib/stats/sweep/types';
import { BadInput } from '$lib/stats/types';
import { type ExitCode, exitCodes, Refusal } from '../shared/exit-codes';
import { inputName } from '../shared/input-name';
import { readInput } from '../shared/read-input';
import { runCommand } from '../shared/run-command';
import { sayProblems } from '../shared/say-problems';
import { help } from './help';
import { type AskedSweep, parseArguments } from './parse-arguments';
import { saySweep } from './say-sweep';
import { sweepInputs } from './sweep-inputs';

/** Runs `sweep` with its arguments, prints, and returns the exit code. */
export const runSweep = (args: string[]): Promise<ExitCode> =>
  runCommand({ help, parse: parseArguments, run }, args);

async function run(asked: AskedSweep): Promise<ExitCode> {
  const report = await reportOf(asked);
  process.stdout.write(asked.json ? `${JSON.stringify(report, null, 2)}\n` : saySweep(report));
  return exitCodes.done;
}

async function reportOf({ file, options, from, to }: AskedSweep): Promise<SweepReport> {
  const result = readCounts(await readInput(file), {});
  if (!result.ok) throw new Refusal(sayProblems(file, result.problems, result.more));
  try {
    const { inputs, timeUnit, mixed } = sweepInputs(result.datasets, options);
    const window = from === null && to === null ? null : { from: from ?? 0, to: to ?? Number.MAX_VALUE };
    return sweepReport(inputs, { ...options, timeUnit, window }, mixed);
  } catch (error) {
    if (error instanceof BadInput) throw new Refusal([`${inputName(file)}: ${error.reason}`]);
    throw error;
  }
}
