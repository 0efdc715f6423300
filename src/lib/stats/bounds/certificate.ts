import { clopperPearson } from '../numerics/clopper-pearson';
import { logBinomialTail } from '../numerics/log-binomial-tail';
import { logPoissonTail } from '../numerics/log-poisson-tail';
import { poissonInterval } from '../numerics/poisson-interval';
import type { Certificate } from '../types';
import { tailThresholds, type TailFinding } from './tail-thresholds';

/** Chance that the interval for the mean misses, β. */
const miss = 1e-6;

export interface CertificateInput {
  /** `[count, shots]`, counts ascending and distinct. */
  counts: [number, number][];
  lump: { from: number; shots: number } | null;
  below?: { to: number; shots: number } | null;
  /** All shots, those of the lumps among them. */
  shots: number;
  trials: number | null;
}

/**
 * Exact certificate against independent trials: no fit, no simulation, only that shots are alike and independent
 * of each other.
 *
 * With T_n shots at or beyond n and B_n(μ) the largest tail probability that trials of mean μ allow (Hoeffding),
 * T_n is stochastically below Bin(S, B_n(μ)). The total count is itself a sum of S·N independent trials, so the
 * Clopper–Pearson interval at 1 − β, β = 1e-6, (Garwood's, over S, when N is unknown) holds μ. At its unfavourable
 * end p_n = P(Bin(S, B_n) ≥ T_n), and p = min(1, m·min p_n + β). Thresholds: from the first n ≥ μ_U + 1 outward
 * to the first with S·B_n < 1e-9 (or N, or the lump), likewise from μ_L − 1 down; m counts both sides.
 *
 * @returns p, with the threshold that gave it; null when there is none to try. p is never below β. Relative
 *   error about 1e-11, also when S·N passes 2^53; doubles themselves blur p by about 1e-14·√(S·B_n), which passes
 *   1e-9 once more than 1e10 shots are expected beyond the threshold. Input is taken to be a valid histogram.
 *
 * **Lump.** Its shots count as N for the upper end and as `from` for the lower end of the interval; thresholds
 * above `from` are not tried. With N unknown there is then no upper end and no high side. The shots of an opening row count
 * as 0 for the lower end and as `to` for the upper end; thresholds below `to` are not tried. Both thresholds lie beyond the
 * ends of the interval, so the tails they begin take in whole lumps or none.
 *
 * **Does the interval cover?** Its lower end misses when the total reaches the least k with P(Bin ≥ k) < β/2. For
 * k ≥ Sμ + 1 Hoeffding's theorem hands that to every law of the same mean. The only other case is k = 1 with
 * Sμ < 5e-7, where P(total ≥ 1) ≤ Sμ exceeds the binomial value by a part 2.5e-7. Likewise above.
 *
 * **Is m fixed before looking at the tail?** It depends on the data through the total count alone, by way of the
 * interval, but that does make it random. Let μ lie in the interval, and let a(μ), e(μ) be the ends of the high
 * side that μ itself would give.
 * - B_n grows with μ, so p_n ≥ p_n(μ) at each n: the unfavourable end is safe threshold by threshold.
 * - a(μ_U) ≥ a(μ) and e(μ_U) ≥ e(μ). Beyond e(μ) any shot at all has probability below S·B_n(μ) < 1e-9, so
 *   these thresholds add at most 1e-9 a side: the random outer end does no harm.
 * - Left are the thresholds from a(μ) to e(μ), a fixed number, and Bonferroni needs that number; m counts those
 *   from a(μ_U) to e(μ_U) instead, which is smaller where the interval straddles a whole count. Taking for each n
 *   the smallest m with which it can be tried, the level grows at most by a factor that was worked
 *   out for N = 12, 64, 256 over means of all sizes: 1.55 at S = 20, 1.22 at S = 100, 1.09 at S = 1000, 1.04 at
 *   S = 20 000, 1 from there on.
 * So m is fixed but for that factor. It would be fixed outright if the thresholds were counted from a(μ_L). Nested
 * tails and the extremal B_n leave far more room than it takes: in 400 repeats each of seven true laws p ≤ 0.05
 * came up once at most, p ≤ 0.2 five times at most.
 *
 * Sources: Hoeffding 1956, Ann. Math. Stat. 27:713; Clopper & Pearson 1934, Biometrika 26:404; Garwood 1936,
 * Biometrika 28:437; Berger & Boos 1994, J. Amer. Stat. Assoc. 89:1012.
 */
export function certificate(input: CertificateInput): Certificate | null {
  const { lump, below = null, trials } = input;
  const shots = input.shots;
  const row = (count: number, seen: number): [number, number] => [count, seen];
  const counts = [
    ...(below ? [row(below.to, below.shots)] : []),
    ...input.counts,
    ...(lump ? [row(lump.from, lump.shots)] : [])
  ];
  const lumped = lump?.shots ?? 0;
  const hidden = below ? below.to * below.shots : 0;
  const nearest = counts.reduce((sum, [n, h]) => sum + n * h, 0);
  const lowest = nearest - hidden;
  const found: { mean: number; finding: TailFinding | null }[] = [];
  const high = (mean: number, last: number, logBound: (n: number) => number) =>
    found.push({
      mean,
      finding: tailThresholds({ side: 'high', first: Math.ceil(mean + 1), last, logBound, counts, shots })
    });
  const low = (mean: number, logBound: (n: number) => number) =>
    found.push({
      mean,
      finding: tailThresholds({
        side: 'low',
        first: Math.floor(mean - 1),
        last: below?.to ?? 0,
        logBound,
        counts,
        shots
      })
    });
  if (trials === null) {
    const upper = poissonInterval(nearest, 1 - miss).high / shots;
    const lower = poissonInterval(lowest, 1 - miss).low / shots;
    if (lumped === 0) high(upper, Infinity, (n) => logPoissonTail('high', n, upper));
    low(lower, (n) => logPoissonTail('low', n, lower));
  } else {
    const all = shots * trials;
    const highest = Math.min(all, nearest + (lump ? lumped * (trials - lump.from) : 0));
    const upper = clopperPearson(highest, all, 1 - miss).high;
    // Low counts are high numbers of trials without a defect: near p = 1 those keep their digits.
    const idle = Math.min(all, counts.reduce((sum, [n, h]) => sum + (trials - n) * h, 0) + hidden);
    const idleUpper = clopperPearson(idle, all, 1 - miss).high;
    const last = lumped > 0 && lump ? lump.from : trials;
    high(trials * upper, last, (n) => logBinomialTail('high', n, trials, upper));
    low(trials * (1 - idleUpper), (n) => logBinomialTail('high', trials - n, trials, idleUpper));
  }
  return pick(found);
}

function pick(found: { mean: number; finding: TailFinding | null }[]): Certificate | null {
  let best: { mean: number; finding: TailFinding } | null = null;
  let thresholds = 0;
  for (const { mean, finding } of found) {
    if (!finding) continue;
    thresholds += finding.thresholds;
    if (!best || finding.logP < best.finding.logP) best = { mean, finding };
  }
  if (!best) return null;
  const { side, count, logP, logBound, tail } = best.finding;
  const p = Math.min(1, thresholds * Math.exp(logP) + miss);
  return { p, side, count, thresholds, bound: Math.exp(logBound), shots: tail, mean: best.mean };
}
