import { makePerson } from '../../auth/make-person';
import type { Database } from '../../db/client';
import { membership, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { takeSample } from '../datasets/take-sample';
import { enqueueJobs } from '../jobs/enqueue-jobs';
import { CATALOGUE } from '../sample-catalogue';
import { makeTeam } from '../teams/make-team';
import { seedDemoGate } from './seed-demo-gate';
import { seedDemoMap } from './seed-demo-map';
import { DEMO_PASSWORD, DEMO_PEOPLE, DEMO_TEAM } from './demo-people';

/**
 * Fills an empty database with an invented team, so that there is something to look at: a person for each role, every
 * invented example as datasets, a diagnosis of each in the queue, the rule of a gate, and a map of sites; the sweep of
 * the ramps is made after their diagnoses (save-report-and-sweep.ts). Does nothing where anybody exists already.
 *
 * @returns whether the team was made
 */
export async function seedDemoTeam(db: Database, now = Date.now()): Promise<boolean> {
  if (db.select({ id: person.id }).from(person).limit(1).get()) return false;
  const members: Record<string, string> = {};
  for (const { email, name, role } of DEMO_PEOPLE) {
    const made = await makePerson(db, { email, name, password: DEMO_PASSWORD, verified: true }, now);
    // Somebody else was quicker: a second process seeds the same database.
    if (!made.ok) return false;
    members[role] = made.person.id;
  }
  const made = makeTeam(db, members.lead, DEMO_TEAM, now);
  if (!made.ok) return false;
  const teamId = made.team.id;
  for (const { role } of DEMO_PEOPLE.slice(1)) {
    db.insert(membership).values({ teamId, personId: members[role], role, createdAt: now }).run();
  }
  const actor: Actor = { personId: members.experimenter, teamId, role: 'experimenter' };
  for (const { slug, invented } of CATALOGUE) {
    if (!invented) continue;
    const taken = takeSample(db, actor, slug, now);
    if (!taken.ok)
      throw new Error(`The example ${slug} could not be taken into the demo team: ${taken.reason}.`);
    enqueueJobs(
      db,
      actor,
      taken.saved.map(({ id }) => id),
      {},
      now
    );
  }
  seedDemoGate(db, actor);
  seedDemoMap(db, actor, now);
  return true;
}
