import { answer } from './answer/answer';
import { cautions } from './answer/cautions';
import { criticalTrials } from './bounds/critical-trials';
import { driftReport } from './drift/drift-report';
import { engineVersion } from './engine-version';
import { explainRuledOut } from './explanations/explain-ruled-out';
import { fitData } from './fit/fit-data';
import { evidenceOf } from './flags/gather-evidence';
import { ringAsRead } from './flags/evidence';
import { raiseFlags } from './flags/raise-flags';
import { checkOptions } from './input/check-options';
import { digest } from './input/digest';
import { inUnits } from './input/in-units';
import { toHistogram } from './input/to-histogram';
import { lumpedLimits } from './moments/lumped-limits';
import { momentReport } from './moments/moment-report';
import { adjust } from './multiple/adjust';
import { independentNull } from './nulls/independent-null';
import { keptCounts } from './nulls/kept-counts';
import { keptNull } from './nulls/kept-null';
import { cutReach } from './truncation/cut-reach';
import { meanFixesVariance } from './nulls/mean-fixes-variance';
import { misreadApplies } from './nulls/misread-applies';
import { misreadNull } from './nulls/misread-null';
import { misreadReport } from './nulls/misread-report';
import { orderTests } from './order/order-tests';
import { pairsReport } from './pairs/pairs-report';
import { rateSpread } from './rate-interval/rate-spread';
import { equalTrials } from './references/equal-trials';
import { varianceTest } from './resampling/ceiling-test';
import type { DrawHelper } from './resampling/draw-helper';
import { fittedTests } from './resampling/fitted-tests';
import { pacer } from './resampling/pacer';
import { emptyAside } from './truncation/empty-aside';
import { trialsReport } from './sensitivity/trials-report';
import type { CountData, DiagnoseOptions, Diagnosis, OnProgress } from './types';
import { distribution } from './views/distribution';
import { lawTable } from './views/law-table';
import { ratePoints } from './views/rate-points';
import { tailPoints } from './views/tail-points';

/**
 * The main job: counts in, the diagnosis document out.
 *
 * Pure: the same data, options and engine version give the same document, in a page, a worker or a server.
 *
 * @param data histogram or shot list, counts in defects
 * @param options see DiagnoseOptions; start from defaultOptions
 * @param onProgress told a share and a step every 60 ms or so
 * @param signal cancels: the promise then rejects with the signal's reason
 * @param helper asked for some of the draws where they take long, as a rule a second thread; ended by who gave it
 * @throws BadInput, with a reason in words, for data or options that cannot be diagnosed
 */
export async function diagnose(
  data: CountData,
  options: DiagnoseOptions,
  onProgress?: OnProgress,
  signal?: AbortSignal,
  helper?: DrawHelper
): Promise<Diagnosis> {
  checkOptions(options);
  const given = toHistogram(data);
  const { histogram, trials } = inUnits(given, options.trials, options.unit);
  const pace = pacer(onProgress, signal);
  await pace.step('fit', 0);
  const counts = fitData(histogram, trials);
  const lumped = histogram.lump !== null || Boolean(histogram.below);
  const drawing = { resamples: options.resamples, seed: options.seed };
  const equal = equalTrials(counts, trials).parameter;
  const misread = misreadApplies(options, counts);
  const kept = keptCounts(options, histogram, counts, misread);
  const tested = kept
    ? keptNull(counts, kept, options)
    : misread.applies
      ? misreadNull(counts, histogram, misread.rate, options)
      : await independentNull(counts, histogram, equal, options, () => pace.step('floor', 0.04));
  const { law } = tested;
  const moments = momentReport(histogram, trials, equal, drawing, tested.ceiling);
  const spread = moments.variance.value !== null && moments.variance.value > 0;
  await pace.step('resampling', 0.08);
  // The variance is then that of its ceiling whatever the data: only rounding and S/(S − 1) would be tested.
  const fixed = meanFixesVariance(trials, kept);
  const ceiling =
    spread && !fixed
      ? await varianceTest(
          counts,
          tested.mostDispersed.window,
          tested.mostDispersed.ceiling,
          drawing,
          pace.within(0.08, 0.12)
        )
      : null;
  const unsure = misread.applies ? misread.limits : undefined;
  const fitted = await fittedTests(counts, tested, drawing, pace.within(0.12, unsure ? 0.3 : 0.8), helper);
  await pace.step('shot order', 0.8);
  const order = await orderTests(data, drawing, pace.within(0.8, 0.88));
  const atStated = [...(ceiling ? [ceiling] : []), ...fitted.tests];
  const known = { counts, histogram, options, moments, tested, tests: atStated, order: order.tests };
  const over =
    unsure && ceiling
      ? await rateSpread({ ...known, limits: unsure }, pace.within(0.3, 0.8), helper)
      : undefined;
  const certificate = over ? over.certificate : tested.certificate;
  const tests = adjust([...(over?.tests ?? atStated), ...order.tests]);
  const table = lawTable(counts, law);
  const shown = distribution(histogram, counts.total, trials, table);
  const drift = await driftReport(
    data,
    trials,
    moments,
    tested,
    options,
    tests.some(({ id, p }) => id === 'ceiling' && p <= options.alpha),
    pace.within(0.88, 0.9)
  );
  const read = misreadReport(options, histogram, moments, equal, law, counts.total, over?.spread);
  const evidence = evidenceOf({
    options,
    counts,
    trials,
    moments,
    tests,
    certificate,
    fitted,
    law,
    neighbours: order.neighbours,
    misread,
    rates: over?.spread,
    drift,
    fixed,
    cut: kept ? cutReach(tested.mostDispersed.window, kept, trials!) : undefined
  });
  const pairs = pairsReport(given, counts.total, options, evidence.even, ringAsRead(evidence));
  const flags = raiseFlags(evidence);
  const aside =
    !kept && !misread.applies && flags.some(({ id }) => id === 'dead-shots')
      ? await emptyAside(counts, options, pace.within(0.9, 0.9), helper)
      : null;
  // A lump hides the variance; other nulls have ceilings of their own.
  const run =
    lumped || misread.applies || kept
      ? undefined
      : trialsReport(moments, counts.first + counts.shots.length - 1, trials, options.tolerance);
  const nuisances = {
    ...(read && { misread: read }),
    ...(drift && { drift }),
    ...(pairs && { pairs }),
    ...(aside && { emptyAside: aside }),
    ...(run && { trials: run }),
    ...(lumped && { lumped: lumpedLimits(histogram, trials) })
  };
  const said = answer(evidence, flags);
  let explanations: Diagnosis['explanations'];
  // The stories know nothing of a cut.
  if (said.verdict === 'ruled-out' && !kept) {
    await pace.step('explanations', 0.9);
    const drifted = flags.some(({ id }) => id === 'drift');
    const found = { counts, options, moments, tested, tests, drifted };
    explanations = await explainRuledOut(found, pace.within(0.9, 0.99));
  }
  await pace.step('writing', 0.99);
  return {
    format: 'severalty.diagnosis/1',
    engine: {
      version: engineVersion,
      seed: options.seed,
      resamples: options.resamples,
      alpha: options.alpha,
      tolerance: options.tolerance
    },
    data: {
      digest: digest(given),
      shots: counts.total,
      trials: options.trials,
      unit: options.unit,
      geometry: options.geometry,
      misread: options.misread,
      ...(options.misreadUncertainty && { misreadUncertainty: options.misreadUncertainty }),
      counts: given.counts,
      lump: given.lump,
      ...(given.below && { below: given.below }),
      ...(options.kept && { kept: options.kept }),
      ordered: data.kind === 'shots',
      batches: data.kind === 'shots' && data.batches ? new Set(data.batches).size : null
    },
    moments: {
      ...moments,
      criticalTrials:
        spread && !lumped && !misread.applies && !kept
          ? criticalTrials(moments.mean.value!, moments.variance.value!)
          : null
    },
    ...(Object.keys(nuisances).length > 0 && { nuisances }),
    fit: tested.report(fitted),
    distribution: shown,
    rate: ratePoints(shown, counts.total, trials, table),
    tails: { points: tailPoints(shown, counts.total, table, tested.bounds), certificate },
    tests,
    notRun: [
      ...(ceiling
        ? []
        : [
            {
              id: 'ceiling' as const,
              reason: spread
                ? trials === 1
                  ? 'One trial cannot exceed its own ceiling.'
                  : 'With two counts kept the mean fixes the variance: no excess could show.'
                : 'The counts have no spread to compare with the ceiling.'
            }
          ]),
      ...fitted.notRun,
      ...order.notRun
    ],
    flags,
    answer: said,
    cautions: cautions(evidence, histogram, tests),
    ...(explanations && { explanations })
  };
}
