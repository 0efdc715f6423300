import { readCounts } from '$lib/formats/read-counts';
import type { Dataset } from '$lib/formats/types';
import { BadInput } from '$lib/stats/types';
import { gateReport } from '$lib/stats/versions/gate-report';
import { type ExitCode, gateCodes, Refusal } from '../shared/exit-codes';
import { inputName } from '../shared/input-name';
import { readInput } from '../shared/read-input';
import { runCommand } from '../shared/run-command';
import { sayProblems } from '../shared/say-problems';
import { gateCells } from './gate-cells';
import { help } from './help';
import { type AskedGate, parseArguments } from './parse-arguments';
import { sayGate } from './say-gate';

/** Runs `gate` with its arguments, prints, and returns the exit code: the outcome. */
export const runGate = (args: string[]): Promise<ExitCode> =>
  runCommand({ help, parse: parseArguments, run, internalError: gateCodes.internalError }, args);

async function run({ files, version, rule, device, trials, json }: AskedGate): Promise<ExitCode> {
  const datasets: Dataset[] = [];
  for (const file of files) {
    const read = readCounts(await readInput(file), {});
    if (!read.ok) throw new Refusal(sayProblems(file, read.problems, read.more));
    datasets.push(...read.datasets);
  }
  try {
    const cells = gateCells(datasets, { device, trials, versions: [version, rule.reference] });
    const report = gateReport(rule, version, cells);
    process.stdout.write(json ? `${JSON.stringify(report, null, 2)}\n` : sayGate(report));
    return gateCodes[report.outcome];
  } catch (error) {
    if (error instanceof BadInput) throw new Refusal([`${files.map(inputName).join(', ')}: ${error.reason}`]);
    throw error;
  }
}
