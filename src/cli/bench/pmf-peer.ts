import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { Peers } from './peers';

/** Methods of R's PoissonBinomial that are exact up to rounding. */
const exact = ['Convolve', 'DivideFFT', 'Characteristic', 'Recursive'];

/**
 * CPU seconds of R's quickest exact pmf by "kind trials", from pmf.R; null when it cannot run.
 *
 * Its probabilities are drawn like ours, uniform or scaled to the same mean, by another generator.
 */
export function pmfPeer({ folder, python }: Peers): Map<string, number> | null {
  if (!existsSync(join(folder, 'data', 'p_unif_12.f64'))) {
    const made = spawnSync(python, ['pmf_inputs.py'], { cwd: folder });
    if (made.status !== 0) return null;
  }
  const { status, stdout } = spawnSync('Rscript', ['pmf.R', 'quick'], { cwd: folder, encoding: 'utf8' });
  if (status !== 0) return null;
  const best = new Map<string, number>();
  for (const line of stdout.split('\n').slice(1)) {
    const [kind, trials, method, seconds] = line.split('\t');
    if (!exact.includes(method)) continue;
    const key = `${kind === 'unif' ? 'uniform' : kind} ${trials}`;
    best.set(key, Math.min(best.get(key) ?? Infinity, Number(seconds)));
  }
  return best;
}
