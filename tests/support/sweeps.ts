import type { SweepRequest } from '$lib/model/team/sweeps/sweep-request';
import type { Database } from '$lib/server/db/client';
import type { Actor } from '$lib/server/services/access/actor';
import { saveSweep } from '$lib/server/services/sweeps/save-sweep';
import { drawn, landauZenerPmf, quenchTimes } from '../unit/stats/sweep/simulated';
import { makeDataset } from './datasets';
import { freshDatabase } from './fresh-database';
import { makeMember, makeTeam } from './people';

export const times = quenchTimes(9);
export const free = times.map(landauZenerPmf);

/** Kinks of a ring, even by their nature, as datasets of a team: counted in pairs. */
export function makeQuench(db: Database, actor: Actor, laws: Float64Array[], seed: number): string[] {
  return drawn(laws, 5000, seed).map((pairs, i) =>
    makeDataset(db, actor, {
      name: `quench ${i + 1}`,
      counts: JSON.stringify({ kind: 'histogram', counts: pairs.map(([n, s]) => [2 * n, s]), lump: null }),
      unit: 'pair',
      geometry: 'ring-bonds',
      trials: 512,
      device: 'Invented ring',
      quenchTime: times[i],
      quenchUnit: 'µs'
    })
  );
}

export const asked = (datasets: string[], more: Partial<SweepRequest> = {}): SweepRequest => ({
  datasets,
  axis: 'quench-time',
  window: null,
  transition: { dimension: 1, correlation: 1, dynamic: 1 },
  alpha: 0.05,
  ...more
});

export function setting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  const people = (['lead', 'experimenter', 'experimenter', 'observer'] as const).map((role) =>
    makeMember(db, team.id, role)
  );
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  return { db, people, lead: people[0], maker: people[1], other: people[2], observer: people[3], stranger };
}

export const saved = (db: Database, actor: Actor, request: SweepRequest): string => {
  const made = saveSweep(db, actor, request, 5);
  if (!made.ok) throw new Error(JSON.stringify(made));
  return made.id;
};
