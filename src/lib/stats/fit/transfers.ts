import { copyLevels, type TrialLevels } from './trial-levels';

/**
 * Neighbours in the whole-number part of a law: `size` trials pass between levels next to each other, either
 * way, the sure and the impossible trials counting as levels. Multiplicities are integers, so these are the
 * steps that no slope shows. With size 1 come those that exchange two multiplicities: where two maxima lie
 * close, they mostly differ so.
 */
export function transfers(levels: TrialLevels, size: number): TrialLevels[] {
  const order = levels.p.map((_, j) => j).sort((a, b) => levels.p[b] - levels.p[a]);
  // Pool −1 is "ones", pool J is "zeros".
  const pools = [...(levels.ones > 0 ? [-1] : []), ...order, ...(levels.zeros > 0 ? [levels.p.length] : [])];
  const out: TrialLevels[] = [];
  for (let i = 0; i + 1 < pools.length; i++) {
    const [a, b] = [pools[i], pools[i + 1]];
    const sizes = new Set([size, -size]);
    if (size === 1 && a >= 0 && b < levels.p.length) sizes.add(levels.trials[a] - levels.trials[b]);
    for (const passing of sizes) {
      const next = passing === 0 ? null : passed(levels, a, b, passing);
      if (next) out.push(next);
    }
  }
  return out;
}

/** `size` trials from pool a to pool b (negative: back); null when one would run empty or is boundless. */
function passed(levels: TrialLevels, a: number, b: number, size: number): TrialLevels | null {
  const [from, to] = size > 0 ? [a, b] : [b, a];
  const many = Math.abs(size);
  const out = copyLevels(levels);
  for (const [pool, change] of [
    [from, -many],
    [to, many]
  ]) {
    if (pool < 0) out.ones += change;
    else if (pool < levels.p.length) out.trials[pool] += change;
    else out.zeros += change;
  }
  if (out.ones < 0 || out.zeros < 0 || out.trials.some((trials) => trials < 1)) return null;
  // The level that lost or gained keeps its sum of probabilities, so that the mean stays.
  for (const pool of [from, to]) {
    if (pool < 0 || pool >= levels.p.length) continue;
    const other = pool === from ? to : from;
    const passing = many * (other < 0 ? 1 : other < levels.p.length ? levels.p[other] : 0);
    const sum = levels.p[pool] * levels.trials[pool] + (pool === from ? -passing : 0);
    if (pool === from || other < 0 || other >= levels.p.length) {
      const held = pool === from ? sum : sum + passing;
      out.p[pool] = Math.min(0.999, Math.max(0.001, held / out.trials[pool]));
    }
  }
  return out;
}
