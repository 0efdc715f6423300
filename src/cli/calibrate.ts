import { writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { isMainThread, parentPort } from 'node:worker_threads';
import { summary } from '$lib/stats/calibration/summary';
import { readArguments } from './calibrate/arguments';
import { runJob } from './calibrate/job';
import { plan } from './calibrate/plan';
import { reportGates } from './calibrate/report-gates';
import { reportPlans, reportPrinted } from './calibrate/report-apart';
import { reportTogether, reportTruths, reportViolations } from './calibrate/report';
import { runJobs, type FromThread, type ToThread } from './calibrate/run-jobs';

/**
 * `npm run calibrate`: diagnoses shots whose cause is known, many times over. Under independent trials each test
 * may call at most its level false; under known violations it should see them. Also the script of its threads.
 */
if (isMainThread) await main();
else serve();

function serve(): void {
  parentPort!.on('message', ({ number, job }: ToThread) => {
    void runJob(job).then((outcomes) => parentPort!.postMessage({ number, outcomes } satisfies FromThread));
  });
}

async function main(): Promise<void> {
  const read = readArguments(process.argv.slice(2));
  if (!read.ok) {
    console.error(read.reason);
    process.exit(2);
  }
  const { asked } = read;
  for (const what of asked.instead)
    console.log(
      what === 'plans'
        ? reportPlans(asked.seed)
        : what === 'gates'
          ? reportGates(asked.seed, asked.repeats(500))
          : reportPrinted(asked.seed, asked.repeats(500))
    );
  if (asked.instead.length > 0) return;
  const { rows, jobs } = plan(asked);
  const started = Date.now();
  let told = started;
  const results = await runJobs(fileURLToPath(import.meta.url), jobs, asked.threads, (done) => {
    if (Date.now() - told < 5000) return;
    told = Date.now();
    const left = ((told - started) / done) * (jobs.length - done);
    console.error(`${done} of ${jobs.length} parts, about ${Math.ceil(left / 60_000)} minutes left`);
  });
  const summaries = rows.map((row, index) => {
    const outcomes = results.filter((_, job) => jobs[job].row === index).flat();
    const name = row.strength === null ? row.id : `${row.id} ${row.strength}`;
    return summary(name, row.shots, outcomes);
  });
  const truths = summaries.filter((_, index) => rows[index].strength === null);
  const broken = summaries.filter((_, index) => rows[index].strength !== null);
  const { resamples, full, seed } = asked;
  console.log(
    `Whole diagnoses with ${resamples} resamples; where those leave the answer at 1 % open, with ${full}. ` +
      `Seed ${seed}, ${Math.round((Date.now() - started) / 1000)} s. Shares in per cent.`
  );
  if (truths.length > 0) {
    console.log(
      `\nFalse alarms at a nominal 5 %, and coverage of nominal 95 % intervals\n${reportTruths(truths)}`
    );
    console.log(`\nAll truths together\n${reportTogether(truths)}`);
  }
  if (broken.length > 0) console.log(`\nPower at a nominal 5 %\n${reportViolations(broken)}`);
  if (asked.json) {
    const document = { resamples, full, seed, truths, violations: broken };
    writeFileSync(asked.json, `${JSON.stringify(document, null, 1)}\n`);
  }
}
