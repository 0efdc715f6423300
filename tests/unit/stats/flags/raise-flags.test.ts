import { raiseFlags } from '$lib/stats/flags/raise-flags';
import type { Diagnosis } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { evidence, interval, type Made } from './make-evidence';

const raised = (made: Made) => raiseFlags(evidence(made)).map(({ id, grade }) => `${id} ${grade}`);
const certificate = {
  p: 1e-5,
  side: 'high' as const,
  count: 15,
  thresholds: 9,
  bound: 1e-4,
  shots: 9,
  mean: 6
};

describe('raiseFlags', () => {
  it('raises nothing where nothing was found', () => {
    expect(raised({})).toEqual([]);
  });

  it.each<[string, Made, string[]]>([
    [
      'the ceiling with both tails',
      { p: { ceiling: 0.001, 'high-tail': 0.01, 'low-tail': 0.01 } },
      ['bunching shown']
    ],
    ['the ceiling alone', { p: { ceiling: 0.001 } }, ['bunching shown']],
    [
      'the ceiling with a low tail that cannot be asked',
      { p: { ceiling: 0.03, 'high-tail': 0.03, 'low-tail': undefined } },
      ['bunching hinted']
    ],
    [
      'the ceiling and the high tail, the low one quiet',
      { p: { ceiling: 0.001, 'high-tail': 0.001 } },
      ['bursts shown']
    ],
    ['the high tail alone', { p: { 'high-tail': 0.04 } }, ['bursts hinted']],
    ['a certificate of the high tail', { over: { certificate } }, ['bursts shown']],
    [
      'the low tail alone',
      { p: { 'low-tail': 0.01 }, over: { lowTailOfTheRest: 0.01 } },
      ['coarsening shown']
    ],
    [
      'the low tail that goes with the empty shots',
      { p: { 'low-tail': 0.01 }, over: { lowTailOfTheRest: 0.3 } },
      []
    ],
    [
      'the low tail without empty shots',
      { p: { 'low-tail': 0.01 }, over: { lowTailOfTheRest: null, empty: { seen: 0, expected: null } } },
      ['coarsening shown']
    ],
    [
      'the ceiling and the low tail, the high one quiet',
      { p: { ceiling: 0.001, 'low-tail': 0.001 }, over: { lowTailOfTheRest: 0.01 } },
      ['coarsening shown']
    ],
    ['empty shots', { p: { 'empty-shots': 0.001 } }, ['dead-shots shown']],
    [
      'parity at many counts',
      { p: { parity: 0.001 }, over: { even: { seen: 1800, expected: 0.5, oneCountAlone: false } } },
      ['pairing shown']
    ],
    ['parity through one count', { p: { parity: 0.001 } }, []],
    ['batches', { p: { batches: 0.001 } }, ['drift shown']],
    ['order, a hint', { p: { order: 0.03 } }, ['drift hinted']],
    ['a variance far below the ceiling', { dispersion: interval(0.5) }, ['regular shown']],
    ['a variance somewhat below', { dispersion: interval(0.8, 0.75, 0.85) }, ['regular hinted']],
    ['a variance below, not surely', { dispersion: interval(0.85, 0.75, 0.95) }, []]
  ])('by %s', (_name, made, want) => {
    expect(raised(made)).toEqual(want);
  });

  it('blames the unit, and nothing else, when every count is even', () => {
    const even = { seen: 3000, expected: 0.5, oneCountAlone: false };
    const p = { ceiling: 0.001, 'high-tail': 0.001, 'low-tail': 0.001, parity: 0.001, 'empty-shots': 0.001 };
    const flags = raiseFlags(evidence({ p, over: { even } }));
    expect(flags.map(({ id }) => id)).toEqual(['pairing']);
    expect(flags[0].statement).toMatch(/Every count is even/);
    expect(flags[0].next[0]).toMatch(/pairs as the unit/);
  });

  it('tells shown before hinted, remarks last', () => {
    const flags = raised({
      p: { ceiling: 0.03, parity: 0.001, batches: 0.001 },
      over: { even: { seen: 1800, expected: 0.5, oneCountAlone: false } }
    });
    expect(flags).toEqual(['pairing shown', 'drift shown', 'bunching hinted']);
    const remark = raised({ p: { 'high-tail': 0.04 }, dispersion: interval(0.5) });
    expect(remark).toEqual(['bursts hinted', 'regular shown']);
  });

  it('names other causes and what to do next, and never claims a proof', () => {
    const all: Diagnosis['flags'] = [
      ...raiseFlags(
        evidence({
          p: { ceiling: 0.001, batches: 0.001, parity: 0.001, 'empty-shots': 0.001 },
          over: { even: { seen: 1200, expected: 0.5, oneCountAlone: false } }
        })
      ),
      ...raiseFlags(evidence({ p: { 'high-tail': 0.001 }, dispersion: interval(0.5) })),
      ...raiseFlags(evidence({ p: { 'low-tail': 0.001 }, over: { lowTailOfTheRest: 0.01 } }))
    ];
    expect(new Set(all.map(({ id }) => id)).size).toBe(7);
    for (const flag of all) {
      expect(flag.otherCauses.length, flag.id).toBeGreaterThan(1);
      expect(flag.next.length, flag.id).toBeGreaterThan(0);
      expect(flag.size).not.toMatch(/NaN|undefined|null|Infinity/);
      expect(JSON.stringify(flag)).not.toMatch(/prove[sdn]?\b|proof|is independent|are independent/i);
    }
  });
});
