import { deviceTimeline } from '$lib/server/services/devices/device-timeline';
import { listDevices } from '$lib/server/services/devices/list-devices';
import { nameKnownDevices } from '$lib/server/services/devices/name-known-devices';
import { divergenceLimit } from '$lib/stats/versions/divergence-limit';
import { expect, it } from 'vitest';
import { makeDataset, makeReport } from '../../../../support/datasets';
import { setting } from '../datasets/support';

it('limits the divergence of a version by the reports of both, and not that of the reference', async () => {
  const { db, lead } = setting();
  // Invented counts and report: chance adds 0.001.
  const counts = '{"kind":"histogram","counts":[[0,2000],[1,1900],[2,800],[3,300]],"lump":null}';
  const interval = { value: 0.0002, low: 0, high: 0.0012 };
  const fit = { divergence: 0.0012, divergenceCorrected: 0.0002, divergenceInterval: interval };
  for (const [at, firmware] of ['a', 'b', 'c'].entries()) {
    const conditions = { device: 'Kelp', firmware, group: 'q1', trials: 64, shots: 5000, createdAt: at + 1 };
    const id = makeDataset(db, lead, { ...conditions, counts });
    if (firmware !== 'c') makeReport(db, lead, id, { document: JSON.stringify({ fit }) });
  }
  nameKnownDevices(db);
  const read = await deviceTimeline(db, lead, listDevices(db, lead)[0].id, { reference: null, group: null });
  if (!read.ok) throw new Error(read.reason);
  const [a, b, c] = read.timeline.points;
  const known = { shots: 5000, corrected: 0.0002, chance: 0.001, error: 0.001 / 1.96 };
  expect(b.divergenceLimit).toBeCloseTo(divergenceLimit(known, known), 12);
  expect([a.divergenceLimit, c.divergenceLimit]).toEqual([null, null]);
});
