import { BadInput, type DiagnoseOptions } from '../types';

/** Largest N accepted: beyond, a count of trials is a typing error. */
const mostTrials = 1e9;

/** Refuses options that have no meaning, in words. */
export function checkOptions(options: DiagnoseOptions): void {
  const { trials, alpha, tolerance, resamples, seed, misread, supplied } = options;
  const need = (right: boolean, reason: string) => {
    if (!right) throw new BadInput(reason);
  };
  need(
    trials === null || (Number.isSafeInteger(trials) && trials >= 1 && trials <= mostTrials),
    'The number of trials must be a whole number from 1 to 1 000 000 000, or unknown.'
  );
  need(alpha > 0 && alpha < 0.5, 'The level alpha must lie between 0 and 0.5.');
  need(tolerance > 0 && tolerance <= 10, 'The tolerance must be above 0 and at most 10.');
  need(
    Number.isInteger(resamples) && resamples >= 19 && resamples <= 1_000_000,
    'The number of resamples must be a whole number from 19 to 1 000 000.'
  );
  need(
    Number.isInteger(seed) && seed >= 0 && seed < 2 ** 32,
    'The seed must be a whole number from 0 to 4 294 967 295.'
  );
  need(
    misread === null || (misread >= 0 && misread < 0.5),
    'The misread rate must be at least 0 and below 0.5: at one half the reading says nothing.'
  );
  const unsure = options.misreadUncertainty ?? null;
  need(
    unsure === null || (unsure >= 0 && unsure < 0.5),
    'The uncertainty of the misread rate must be at least 0 and below 0.5.'
  );
  need(
    unsure === null || misread !== null,
    'An uncertainty of the misread rate was given without the rate: give both.'
  );
  if (options.kept) {
    const { from, to } = options.kept;
    const whole = (n: number) => Number.isSafeInteger(n) && n >= 0;
    need(
      whole(from) && (to === null || whole(to)),
      'The counts kept are whole numbers from 0 up: the smallest, and the largest or nothing.'
    );
    need(to === null || to >= from, `No count lies from ${from} to ${to}: that cut leaves nothing.`);
    need(
      to === null || to > from,
      `A cut that keeps only the count ${from} leaves nothing to test: every shot is then the same.`
    );
    need(
      trials === null || from < trials,
      `Of ${trials} trials, a cut from ${from} up leaves at most one count: nothing to test.`
    );
  }
  need(['defect', 'pair'].includes(options.unit), 'The unit is either defect or pair.');
  need(
    ['sites', 'open-bonds', 'ring-bonds'].includes(options.geometry),
    'The geometry is sites, open-bonds or ring-bonds.'
  );
  if (supplied) {
    need(
      supplied.every((p) => p >= 0 && p <= 1),
      'Each supplied probability must lie between 0 and 1.'
    );
    need(
      supplied.length > 0 && supplied.length <= 1e5,
      'A supplied law has from 1 to 100 000 probabilities.'
    );
    const expected = trials === null ? null : options.unit === 'pair' ? trials / 2 : trials;
    need(
      expected === null || supplied.length === expected,
      `The supplied law has ${supplied.length} probabilities, but there are ${expected} trials.`
    );
  }
}
