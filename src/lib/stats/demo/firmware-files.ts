import { betaBinomial } from '../calibration/violations/common-cause';
import { shotsOf } from '../calibration/shots-of';
import { binomialSample } from '../random/binomial-sample';
import { generator } from '../random/generator';

/** Of seed 83 a group fails by chance, as for one seed in twenty or so (calibrate --gates: 5 % of 300 with three versions). */
const SEED = 84;
/** At 5000 a rise of 10 % over the reference would be missed more than one time in five among sixteen tests. */
const SHOTS = 8000;
const QUBITS = 16;
const MEAN = 0.1;
/** Any two qubits of a group are correlated by this much: the variance is 1 + 15 · 0.03 = 1.45 of its ceiling. */
const CROSSTALK = 0.03;

export const FIRMWARE_VERSIONS = ['ebb-3.1', 'ebb-3.2', 'ebb-3.3', 'ebb-3.4'];
export const FIRMWARE_GROUPS = ['q1', 'q2', 'q3', 'q4', 'q5', 'q6', 'q7', 'q8'];
/** Where the crosstalk was added. */
const CROSSED = { version: 'ebb-3.3', groups: ['q2', 'q5'] };

/**
 * Invented histograms of an invented device: eight groups of 16 qubits under four firmware versions, 8000 shots each, every
 * qubit excited with a probability near 0.1; under ebb-3.3 two groups carry crosstalk.
 *
 * @returns name and text of each file, ready for an upload
 */
export function firmwareFiles(): { name: string; text: string }[] {
  return FIRMWARE_VERSIONS.flatMap((version, v) =>
    FIRMWARE_GROUPS.map((group, g) => {
      const random = generator(SEED, v * FIRMWARE_GROUPS.length + g);
      const mean = MEAN + 0.002 * g; // groups differ, as groups do
      const crossed = version === CROSSED.version && CROSSED.groups.includes(group);
      const { counts } = crossed
        ? betaBinomial(random, SHOTS, QUBITS, mean, CROSSTALK)
        : shotsOf(SHOTS, () => binomialSample(random, QUBITS, mean));
      const rows = counts.map(([count, shots]) => `${count},${shots}`);
      const said = `# Invented data, seed ${SEED}. Excited qubits of group ${group}, ${version}, N = ${QUBITS}.`;
      return { name: `${version}-${group}.csv`, text: `${[said, 'count,shots', ...rows].join('\n')}\n` };
    })
  );
}
