import { readCounts } from '$lib/formats/read-counts';
import { readProbabilities } from '$lib/formats/read-probabilities';
import { sayReading } from '$lib/formats/say-reading';
import type { Dataset } from '$lib/formats/types';
import { documentCsv } from '$lib/model/document-csv';
import { documentText } from '$lib/model/document-text';
import { plainText } from '$lib/model/plain-text/plain-text';
import { writeKept } from '$lib/model/read-kept';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { checkOptions } from '$lib/stats/input/check-options';
import { BadInput, type Diagnosis } from '$lib/stats/types';
import { secondThread } from '../shared/second-thread';
import { chooseDataset } from './choose-dataset';
import { type ExitCode, exitCodes, Refusal } from '../shared/exit-codes';
import { help } from './help';
import { inputName } from '../shared/input-name';
import { type Asked, parseOptions } from './parse-options';
import { progressLine } from './progress-line';
import { readInput } from '../shared/read-input';
import { runCommand } from '../shared/run-command';
import { sayProblems } from '../shared/say-problems';
import { type Output, refuseOutput, writeOutput } from './write-output';

/**
 * Runs `diagnose` with its arguments, prints, and returns the exit code.
 *
 * @param script what a second thread runs; see secondThread
 */
export const runDiagnose = (args: string[], script: string): Promise<ExitCode> =>
  runCommand({ help, parse: parseOptions, run: (asked) => run(asked, script) }, args);

async function run(asked: Asked, script: string): Promise<ExitCode> {
  refuseOptions(asked);
  const outputs = outputsOf(asked);
  for (const output of outputs) await refuseOutput(output, asked.file);
  const bytes = await readInput(asked.file);
  const result = readCounts(bytes, asked.read);
  if (!result.ok) throw new Refusal(sayProblems(asked.file, result.problems, result.more));
  const dataset = chooseDataset(asked.file, result.datasets, asked.dataset);
  const supplied = asked.supplied === null ? null : await readSupplied(asked.supplied);
  const diagnosis = await check(asked, dataset, supplied, script);
  const several = result.datasets.length > 1 ? dataset.name : null;
  if (outputs.length > 0) {
    const { makeFiles } = await import('./make-files');
    const made = await makeFiles({ diagnosis, dataset, supplied, file: asked.file, bytes, several }, outputs);
    for (const [output, content] of made) await writeOutput(output, content);
  }
  const about = [...sayReading(result.reading), ...result.notes, ...sayUsed(asked, dataset)];
  if (asked.print === 'text') {
    const named = several === null ? [] : [`Dataset: ${several}.`];
    process.stdout.write(plainText(diagnosis, asked.quiet ? named : [...named, ...about]));
  } else {
    if (!asked.quiet)
      process.stderr.write(about.map((line) => `${inputName(asked.file)}: ${line}\n`).join(''));
    process.stdout.write(asked.print === 'json' ? documentText(diagnosis) : documentCsv(diagnosis));
  }
  return verdictCode(asked, diagnosis);
}

const outputsOf = ({ pdf, bundle }: Asked): Output[] => [
  ...(pdf === null ? [] : [{ option: '--pdf' as const, path: pdf }]),
  ...(bundle === null ? [] : [{ option: '--bundle' as const, path: bundle }])
];

/** Options that no file could make right are refused before one is read, and without its name. */
function refuseOptions(asked: Asked): void {
  try {
    checkOptions({ ...defaultOptions, ...asked.diagnose });
  } catch (error) {
    throw error instanceof BadInput ? new Refusal([error.reason]) : error;
  }
}

async function check(
  asked: Asked,
  dataset: Dataset,
  supplied: number[] | null,
  script: string
): Promise<Diagnosis> {
  const progress = progressLine();
  const helper = secondThread(script);
  try {
    // What the person says wins over what the file states, and that over the defaults.
    const options = { ...defaultOptions, ...dataset.suggested, ...asked.diagnose, supplied };
    return await diagnose(dataset.data, options, progress.show, undefined, helper);
  } catch (error) {
    if (error instanceof BadInput) throw new Refusal([`${inputName(asked.file)}: ${error.reason}`]);
    throw error;
  } finally {
    helper?.end();
    progress.clear();
  }
}

async function readSupplied(file: string): Promise<number[]> {
  const result = readProbabilities(await readInput(file));
  if (!result.ok) throw new Refusal(sayProblems(file, result.problems, result.more));
  return result.probabilities;
}

/** Says which options the file settled, since nobody typed them. */
function sayUsed(asked: Asked, dataset: Dataset): string[] {
  const used = Object.entries(dataset.suggested).filter(([name]) => !Object.hasOwn(asked.diagnose, name));
  return used.map(
    ([name, value]) =>
      `The file states ${name}: ${typeof value === 'object' && value ? writeKept(value) : (value ?? 'unknown')}.`
  );
}

function verdictCode({ failOn }: Asked, { answer }: Diagnosis): ExitCode {
  const ruledOut = answer.verdict === 'ruled-out';
  const failed =
    failOn === 'ruled-out' ? ruledOut : failOn === 'undecided' && answer.verdict !== 'compatible';
  return failed ? exitCodes.failOn : exitCodes.done;
}
