import { readSweep } from './read-sweep';
import { refitSweep } from './refit-sweep';
import { sweptPoint } from './swept-point';
import type { MixedCondition, SweepInput, SweepOptions, SweepReport } from './types';

/**
 * Everything that is told of a sweep over quench or hold time, as one plain document: cumulants with their intervals,
 * power laws in the window and the test of one exponent for all, ratios beside known laws, how the exponent moves with
 * the window, and the answer in words. The same input gives the same bytes; nothing in it is drawn at random.
 *
 * @param mixed conditions that differ between the datasets, as mixedConditions tells them
 * @throws BadInput as readSweep; RangeError for d, ν or z that are not positive
 */
export const sweepReport = (
  inputs: SweepInput[],
  options: SweepOptions,
  mixed?: MixedCondition[]
): SweepReport =>
  refitSweep(
    readSweep(inputs, options).map((input) => sweptPoint(input, options.axis)),
    options,
    mixed
  );
