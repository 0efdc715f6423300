import { spawnSync } from 'node:child_process';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { bestLaw } from '$lib/stats/fit/best-law';
import { fitData } from '$lib/stats/fit/fit-data';
import { secondThread } from '../shared/second-thread';
import { cpuSeconds } from './cpu';
import { diagnosisCases } from './diagnosis-case';

/** One run of a case in a process of its own. */
export interface DiagnosisTimes {
  /** CPU and passed seconds of the first diagnosis of the process, as a command or a fresh page has it. */
  cpuSeconds: number;
  seconds: number;
  /** CPU seconds of the first fit alone. */
  fitSeconds: number;
  /** Most memory the process held, in MB. */
  memory: number;
  /** Largest number of draws that any test took. */
  draws: number;
  verdict: string;
}

/**
 * What the child does: one fit, one diagnosis, and a line of JSON.
 *
 * @param script what a second thread runs; null for one thread alone
 */
export async function diagnosisChild(id: string, script: string | null): Promise<void> {
  const { trials, histogram } = diagnosisCases.find((one) => one.id === id)!;
  const counts = histogram();
  const start = cpuSeconds();
  bestLaw(fitData(counts, trials));
  const fitSeconds = cpuSeconds() - start;
  const from = performance.now();
  const fromCpu = cpuSeconds();
  const helper = script === null ? undefined : secondThread(script);
  const options = { ...defaultOptions, trials };
  const { tests, answer } = await diagnose(counts, options, undefined, undefined, helper);
  const times: DiagnosisTimes = {
    cpuSeconds: cpuSeconds() - fromCpu,
    seconds: (performance.now() - from) / 1000,
    fitSeconds,
    memory: process.resourceUsage().maxRSS / 1024,
    draws: Math.max(...tests.map((test) => test.resamples)),
    verdict: answer.verdict
  };
  helper?.end();
  process.stdout.write(JSON.stringify(times));
}

/** Runs a case once in a child: memory and first-run compilation are then its own. */
export function timeDiagnosis(script: string, id: string): DiagnosisTimes {
  const { status, stdout, stderr } = spawnSync(process.execPath, [script, '--child', id], {
    encoding: 'utf8'
  });
  if (status !== 0) throw new Error(`${id}: ${stderr}`);
  return JSON.parse(stdout) as DiagnosisTimes;
}
