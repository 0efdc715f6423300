import type { Role } from '$lib/model/team/roles';
import { hashPassword } from '$lib/server/auth/password-hash';
import { databaseFile, openDatabase, type Database } from '$lib/server/db/client';
import { newId } from '$lib/server/db/new-id';
import { membership, person, team } from '$lib/server/db/schema';
import type { RunningServer } from './start-server';

export interface SeededPerson {
  id: string;
  email: string;
  name: string;
  password: string;
}

/**
 * Opens the database of a running server (it takes a second writer), does something with it and closes it again.
 */
export async function withDatabaseOf<T>(
  server: Pick<RunningServer, 'data'>,
  act: (db: Database) => T | Promise<T>
): Promise<T> {
  const db = openDatabase(databaseFile(server.data));
  try {
    return await act(db);
  } finally {
    db.$client.close();
  }
}

/** Somebody with a password and an address that was shown to be theirs. */
export async function seedPerson(
  server: Pick<RunningServer, 'data'>,
  given: Partial<Omit<SeededPerson, 'id'>> = {}
): Promise<SeededPerson> {
  const id = newId();
  const made = {
    id,
    email: given.email ?? `${id}@example.org`,
    name: given.name ?? 'Ada Invented',
    password: given.password ?? `invented ${id}`
  };
  const { email, name, password } = made;
  const row = { id, email, name, passwordHash: await hashPassword(password) };
  await withDatabaseOf(server, (db) =>
    db
      .insert(person)
      .values({ ...row, emailVerifiedAt: 1, createdAt: 1 })
      .run()
  );
  return made;
}

/** A team and who is in it with which role. */
export async function seedTeam(
  server: Pick<RunningServer, 'data'>,
  slug: string,
  members: [person: Pick<SeededPerson, 'id'>, role: Role][] = []
): Promise<{ id: string; slug: string; name: string }> {
  const made = { id: newId(), slug, name: `Team ${slug}` };
  await withDatabaseOf(server, (db) => {
    db.insert(team)
      .values({ ...made, createdAt: 1 })
      .run();
    for (const [{ id: personId }, role] of members)
      db.insert(membership).values({ teamId: made.id, personId, role, createdAt: 1 }).run();
  });
  return made;
}
