import { dataset, job, membership } from '$lib/server/db/schema';
import { passwordFits } from '$lib/server/auth/password-hash';
import { person } from '$lib/server/db/schema';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '$lib/server/services/demo-team/demo-people';
import { demoPeopleOf } from '$lib/server/services/demo-team/demo-people-of';
import { seedDemoTeam } from '$lib/server/services/demo-team/seed-demo-team';
import { seedSamples } from '$lib/server/services/seed-samples';
import { findGate } from '$lib/server/services/gates/find-gate';
import { readGate } from '$lib/server/services/gates/read-gate';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makePerson } from '../../../../support/people';

describe('seedDemoTeam', () => {
  it('makes a person for each role, every invented example as datasets, and a job for each', async () => {
    const db = freshDatabase();
    seedSamples(db);
    expect(await seedDemoTeam(db)).toBe(true);
    expect(demoPeopleOf(db)).toEqual(DEMO_PEOPLE);
    expect(
      new Set(
        db
          .select()
          .from(membership)
          .all()
          .map(({ role }) => role)
      ).size
    ).toBe(3);
    const datasets = db.select().from(dataset).all();
    // Eight single ones, six ramps, four firmware versions, and the counts of two maps of sites.
    expect(datasets).toHaveLength(20);
    expect(datasets.filter(({ name }) => name.startsWith('Wrack, invented: one pair of 64'))).toHaveLength(1);
    for (const { notes } of datasets.filter(({ part }) => part !== 'excited sites'))
      expect(notes).toMatch(/^Invented example/);
    expect(datasets.filter(({ firmware }) => firmware !== null)).toHaveLength(4);
    expect(datasets.filter(({ quenchTime }) => quenchTime !== null)).toHaveLength(6);
    expect(db.select().from(job).all()).toHaveLength(20);
    const lead = db
      .select()
      .from(membership)
      .all()
      .find(({ role }) => role === 'lead')!;
    const found = (version: string) => findGate(db, lead, { device: 'Marram', version });
    const outcomes = ['ebb 3.1', 'ebb 3.2', 'ebb 3.3', 'ebb 3.4'].map((version) => {
      const at = found(version);
      if (!at.ok) throw new Error(at.reason);
      const gate = readGate(db, lead, at.device.id, at.version.id);
      return gate.ok ? gate.report.outcome : gate.reason;
    });
    // Nothing is diagnosed yet; what has failed already stays failed.
    expect(outcomes).toEqual(['undecided', 'undecided', 'failed', 'undecided']);
    const [{ passwordHash }] = db.select().from(person).all();
    expect(await passwordFits(passwordHash, DEMO_PASSWORD)).toBe(true);
  });

  it('does nothing the second time, nor where anybody is', async () => {
    const db = freshDatabase();
    seedSamples(db);
    makePerson(db);
    expect(await seedDemoTeam(db)).toBe(false);
    expect(demoPeopleOf(db)).toEqual([]);
    const other = freshDatabase();
    seedSamples(other);
    await seedDemoTeam(other);
    expect(await seedDemoTeam(other)).toBe(false);
    expect(other.select().from(person).all()).toHaveLength(3);
  });
});
