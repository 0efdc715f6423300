import { planAddress } from '$lib/model/report/plan-address';
import { FRESH_PLAN } from '$lib/page/plan/fields';
import { readPlan } from '$lib/page/plan/read-plan';
import { readTyped } from '$lib/page/typed-address';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { Diagnosis } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';

let undecided: Diagnosis;

beforeAll(async () => {
  const counts: [number, number][] = [
    [2, 6],
    [3, 9],
    [4, 8],
    [6, 7]
  ];
  undecided = await diagnose(
    { kind: 'histogram', counts, lump: null },
    { ...defaultOptions, trials: 40, resamples: 199 }
  );
});

describe('planAddress', () => {
  it('fills in the numbers of an undecided result, and the planner reads them', () => {
    expect(undecided.answer.verdict).toBe('undecided');
    const address = planAddress(undecided)!;
    // (12 + 27 + 32 + 42)/30 = 3.7667.
    expect(address).toBe('/plan#mean=3.767&trials=40&size=0.1&shots=30&alpha=0.01');
    const { fields, unknown } = readTyped(address.split('#')[1], FRESH_PLAN);
    expect(unknown).toEqual([]);
    expect(readPlan(fields)).toMatchObject({
      ok: true,
      asked: { mean: 3.767, trials: 40, size: 0.1, shots: 30 }
    });
  });

  it('counts in pairs where the result does', () => {
    const paired = { ...undecided, data: { ...undecided.data, unit: 'pair' as const } };
    expect(planAddress(paired)).toContain('trials=20&');
  });

  it('is none for another answer, or without a defect', () => {
    const answer = { ...undecided.answer, verdict: 'compatible' as const };
    expect(planAddress({ ...undecided, answer })).toBeNull();
    const mean = { value: 0, low: 0, high: 0.1 };
    expect(planAddress({ ...undecided, moments: { ...undecided.moments, mean } })).toBeNull();
  });
});
