import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { lawWindow } from '$lib/stats/laws/law-window';
import { logChoose } from '$lib/stats/numerics/log-choose';
import { logGamma } from '$lib/stats/numerics/log-gamma';
import type { CountData, DiagnoseOptions, FlagId } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

const options: DiagnoseOptions = { ...defaultOptions, resamples: 1999 };

/** Expected histogram of a law, rounded: made for a cause, without luck in it. */
function expected(f: number[], shots: number): CountData {
  return { kind: 'histogram', counts: f.map((p, n) => [n, Math.round(shots * p)]), lump: null };
}

function binomial(trials: number, p: number): number[] {
  const window = lawWindow({ levels: [{ p, trials }], poissonPart: 0 }, 0, 1);
  return Array.from({ length: trials + 1 }, (_, n) => window.values[n - window.first] ?? 0);
}

/** Beta-binomial of mean p and intraclass correlation rho. */
function betaBinomial(trials: number, p: number, rho: number): number[] {
  const a = p * (1 / rho - 1);
  const b = (1 - p) * (1 / rho - 1);
  const beta = (x: number, y: number) => logGamma(x) + logGamma(y) - logGamma(x + y);
  return Array.from({ length: trials + 1 }, (_, n) =>
    Math.exp(logChoose(trials, n) + beta(n + a, trials - n + b) - beta(a, b))
  );
}

async function flagsOf(data: CountData, trials: number | null, more: Partial<DiagnoseOptions> = {}) {
  const found = await diagnose(data, { ...options, trials, ...more });
  return {
    found,
    ids: found.flags.map((flag) => flag.id),
    shown: found.flags.filter((f) => f.grade === 'shown').map((f) => f.id)
  };
}

describe('flags of histograms made for one cause', () => {
  it('clean counts raise none', async () => {
    const { ids, found } = await flagsOf(expected(binomial(24, 0.2), 20000), 24);
    expect(ids).toEqual([]);
    expect(found.answer.verdict).toBe('compatible');
  });

  it('bunching: beta-binomial counts', async () => {
    const { shown, found } = await flagsOf(expected(betaBinomial(24, 0.3, 0.02), 20000), 24);
    expect(shown).toContain('bunching');
    expect(found.answer.verdict).toBe('ruled-out');
  });

  it('bursts: a few shots with many defects', async () => {
    const f = binomial(24, 0.3).map((p) => 0.9995 * p);
    f[19] += 0.0005;
    const { shown } = await flagsOf(expected(f, 20000), 24);
    expect(shown).toContain('bursts');
    expect(shown).not.toContain('coarsening');
  });

  it('dead shots: empty shots added', async () => {
    const f = binomial(24, 0.25).map((p) => 0.98 * p);
    f[0] += 0.02;
    const { shown, ids } = await flagsOf(expected(f, 20000), 24);
    expect(shown).toContain('dead-shots');
    expect(ids).not.toContain('coarsening');
  });

  it('coarsening: a heavy low tail that is not empty shots', async () => {
    const low = binomial(40, 0.1);
    const { shown } = await flagsOf(
      expected(
        binomial(40, 0.5).map((p, n) => 0.999 * p + (n > 0 ? 0.001 * low[n] : 0)),
        20000
      ),
      40
    );
    expect(shown).toContain('coarsening');
    expect(shown).not.toContain('bursts');
  });

  it('pairing, not bunching: kinks on a ring counted singly; compatible when counted in pairs', async () => {
    const pairs = binomial(20, 0.2);
    const ring = Array.from({ length: 41 }, (_, n) => (n % 2 === 0 ? pairs[n / 2] : 0));
    const singly = await flagsOf(expected(ring, 20000), 40);
    expect(singly.shown).toContain('pairing');
    expect(singly.ids).not.toContain('bunching');
    expect(singly.found.answer.statement).toContain('every count is even');
    const paired = await flagsOf(expected(ring, 20000), 40, { unit: 'pair' });
    expect(paired.found.answer.verdict).toBe('compatible');
    expect(paired.ids).not.toContain('pairing');
  });

  it('drift: batches whose rate differs, named in the answer', async () => {
    const shots: number[] = [];
    const batches: string[] = [];
    // Two runs with the quantiles of Bin(30, 0.1) and Bin(30, 0.2), each shuffled by a fixed stride.
    for (const [name, p] of [
      ['morning', 0.1],
      ['evening', 0.2]
    ] as const) {
      const f = binomial(30, p);
      const column = f.flatMap((x, n) => Array<number>(Math.round(400 * x)).fill(n));
      for (let i = 0; i < column.length; i++) shots.push(column[(i * 149) % column.length]);
      batches.push(...Array<string>(column.length).fill(name));
    }
    const { shown, found } = await flagsOf({ kind: 'shots', shots, batches }, 30);
    expect(shown).toContain('drift');
    expect(found.answer.statement).toContain('rate changed');
  });

  it('misreads: hinted for bonds, with the rate that would explain the excess', async () => {
    const { found } = await flagsOf(expected(betaBinomial(50, 0.08, 0.004), 20000), 50, {
      geometry: 'open-bonds'
    });
    expect(found.flags.find((flag) => flag.id === 'misreads')).toMatchObject({ grade: 'hinted' });
  });

  it('regular: hard trials of two kinds', async () => {
    const law = lawWindow(
      {
        levels: [
          { p: 0.95, trials: 5 },
          { p: 0.05, trials: 5 }
        ],
        poissonPart: 0
      },
      0,
      1
    );
    const { found, ids } = await flagsOf(expected([...law.values], 20000), 10);
    expect(ids).toEqual(['regular'] satisfies FlagId[]);
    expect(found.answer.verdict).toBe('compatible');
  });
});

describe('words of flags', () => {
  it('name other causes and a next step, and never claim proof', async () => {
    const { found } = await flagsOf(expected(betaBinomial(24, 0.3, 0.02), 20000), 24);
    for (const flag of found.flags) {
      expect(flag.otherCauses.length).toBeGreaterThan(0);
      expect(flag.next.length).toBeGreaterThan(0);
      expect(flag.statement + flag.size).not.toMatch(/prove/i);
    }
  });
});
