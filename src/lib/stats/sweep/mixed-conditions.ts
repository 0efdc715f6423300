import type { MixedCondition } from './types';

const CONDITIONS = ['device', 'firmware', 'group'] as const;

/**
 * Which conditions differ between the datasets of a sweep: how many are stated of each, and how many datasets state
 * none. Nothing for a condition that all share, or that none states.
 */
export const mixedConditions = (
  datasets: Record<(typeof CONDITIONS)[number], string | null>[]
): MixedCondition[] =>
  CONDITIONS.flatMap((of) => {
    const values = datasets.map((one) => one[of]);
    if (new Set(values).size < 2) return [];
    const stated = values.filter((value) => value !== null);
    return [{ of, stated: new Set(stated).size, unstated: values.length - stated.length }];
  });
