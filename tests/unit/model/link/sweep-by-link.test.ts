import { sweepByLink, type SharedSweep } from '$lib/model/link/sweep-by-link';
import { sweepReport } from '$lib/stats/sweep/sweep-report';
import type { SweepReport } from '$lib/stats/sweep/types';
import { describe, expect, it } from 'vitest';
import { drawn, landauZenerPmf, quenchTimes } from '../../stats/sweep/simulated';

/** Names unlike any word of the program. */
const SECRETS = [
  'Quaggalab',
  'Okapitron',
  'fw-zebu-7',
  'Wombat',
  'Ibexia',
  'gnus',
  'north quoll',
  'sha256:e6'
];
const times = quenchTimes(7);
const inputs = drawn(times.map(landauZenerPmf), 5000, 1).map((counts, i) => ({
  label: `Wombat run ${i + 1}`,
  time: times[i],
  // The last is left out of the fit, and the document says so by its name.
  counts: i === 6 ? ([[1, 30]] as [number, number][]) : counts,
  dataset: { id: `Wombat-${i}`, digest: `sha256:e6${i}`, verdict: i === 0 ? ('ruled-out' as const) : null }
}));
const options = { axis: 'quench-time', unit: 'defect', window: null, transition: null, alpha: 0.05 } as const;
const whole = sweepReport(inputs, { ...options, timeUnit: 'gnus' });
const thing: SharedSweep = {
  team: 'Quaggalab',
  name: 'Wombat sweep',
  notes: 'asked by Ibexia',
  madeBy: 'Ibexia',
  madeAt: Date.UTC(2031, 1, 3),
  engineVersion: '1.2.3',
  document: JSON.stringify(whole),
  sha256: 'none',
  whole: true,
  datasets: inputs.map(({ label }) => ({
    name: label,
    device: 'Okapitron',
    firmware: 'fw-zebu-7',
    group: 'north quoll'
  }))
};

describe('a sweep through a link', () => {
  it('is shown as it is, with whose it is', () => {
    const view = sweepByLink({ blind: false }, thing);
    expect(view.document).toBe(thing.document);
    expect(view.origin).toMatchObject({ team: 'Quaggalab', sources: ['Okapitron, fw-zebu-7, north quoll'] });
    expect(view.fileName).toBe('severalty-wombat-sweep');
    // What is to be hidden is really there.
    for (const secret of SECRETS) expect(JSON.stringify(view), secret).toContain(secret);
  });

  it('tells nothing of whose it is when the link is blind, and every number all the same', () => {
    const view = sweepByLink({ blind: true }, thing);
    for (const secret of [...SECRETS, '2031-02', String(thing.madeAt)])
      expect(JSON.stringify(view), secret).not.toContain(secret);
    const document = JSON.parse(view.document!) as SweepReport;
    expect(document.laws).toEqual(whole.laws);
    expect(document.steady).toEqual(whole.steady);
    expect(document.statement).toBe(whole.statement);
    expect(document.points.map(({ time, cumulants }) => [time, cumulants])).toEqual(
      whole.points.map(({ time, cumulants }) => [time, cumulants])
    );
    expect(document.points[0].dataset?.verdict).toBe('ruled-out');
    expect(document.because.at(-1)).toContain('“dataset 7”');
    expect(document.timeUnit).toBe('');
  });

  it('keeps a unit of time that names nobody', () => {
    const document = JSON.stringify({ ...whole, timeUnit: 'µs' });
    const view = sweepByLink({ blind: true }, { ...thing, document });
    expect((JSON.parse(view.document!) as SweepReport).timeUnit).toBe('µs');
  });

  it('shows no document whose bytes are damaged', () => {
    for (const blind of [true, false])
      expect(sweepByLink({ blind }, { ...thing, whole: false }).document).toBeNull();
  });
});
