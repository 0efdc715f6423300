import { gateRates } from '$lib/stats/calibration/gate-rates';
import { table } from '../shared/table';

const percent = (share: number) => (100 * share).toFixed(1);

/** Gates of three versions beside a reference, without any change and with a rise in one group of eight. */
export function reportGates(seed: number, runs: number): string {
  const rows = [5000, 8000].flatMap((shots) =>
    [0, 0.1].flatMap((tolerance) =>
      [1, 1.1, 1.15, 1.3].map((rise) => {
        const asked = { runs, shots, versions: 3, rise, tolerance, alpha: 0.05, seed };
        const { failed, undecided, passed, anyFailed } = gateRates(asked);
        const shares = [failed, undecided, passed, anyFailed].map(percent);
        return [String(rise), String(shots), String(tolerance), ...shares];
      })
    )
  );
  return (
    `Gates of three versions, eight groups of 64 equal trials at 0.1, alpha 0.05, ${runs} runs each, in per cent\n` +
    table(
      ['rise of one group', 'shots', 'tolerance', 'failed', 'undecided', 'passed', 'any of three failed'],
      rows
    )
  );
}
