import { emailField, nameForm } from '$lib/model/account/sign-in';
import { ROLES, type Role } from '$lib/model/team/roles';
import type { Database } from '$lib/server/db/client';
import { addPerson } from '$lib/server/services/people/add-person';
import { disablePerson, enablePerson } from '$lib/server/services/people/disable-person';
import { listPeople } from '$lib/server/services/people/list-people';
import { randomBytes } from 'node:crypto';
import { parseArgs } from 'node:util';
import { table } from '../shared/table';

export const usage = `npm run people -- list
npm run people -- add EMAIL --name NAME [--team SLUG --role lead|experimenter|observer]
npm run people -- disable EMAIL
npm run people -- enable EMAIL`;

/** What is written, and the exit code: 0 done, 1 not possible as things are, 2 a wrong call. */
export interface Outcome {
  code: 0 | 1 | 2;
  text: string;
}

const wrong = (reason: string): Outcome => ({ code: 2, text: `${reason}\n\n${usage}` });

/** `npm run people`: who may sign in. A running server heeds the change at the next request. */
export async function runPeople(db: Database, args: string[]): Promise<Outcome> {
  let parsed;
  try {
    parsed = parseArgs({
      args,
      allowPositionals: true,
      options: { name: { type: 'string' }, team: { type: 'string' }, role: { type: 'string' } }
    });
  } catch (error) {
    return wrong((error as Error).message);
  }
  const [command, typed, ...more] = parsed.positionals;
  if (command === 'list' && typed === undefined) return list(db);
  if (!['add', 'disable', 'enable'].includes(command) || more.length > 0) return wrong('Say what to do.');
  const email = emailField.safeParse(typed ?? '');
  if (!email.success) return wrong(`${typed ?? ''}: ${email.error.issues[0].message}`);
  if (command === 'add') return add(db, email.data, parsed.values);
  const done = command === 'disable' ? disablePerson(db, email.data) : enablePerson(db, email.data);
  if (!done.ok) return { code: 1, text: `Nobody has the address ${email.data}.` };
  const state = command === 'disable' ? 'closed, and signed out everywhere' : 'open';
  return { code: 0, text: `The account of ${email.data} is ${done.changed ? '' : 'already '}${state}.` };
}

function list(db: Database): Outcome {
  const people = listPeople(db);
  if (people.length === 0) return { code: 0, text: 'Nobody has an account yet.' };
  const rows = people.map((one) => [
    one.email,
    one.name,
    one.disabled ? 'closed' : one.hasPassword ? 'password' : 'by mail or institution',
    one.teams.join(', ')
  ]);
  return { code: 0, text: table(['address', 'name', 'account', 'teams'], rows) };
}

async function add(
  db: Database,
  email: string,
  { name, team, role }: { name?: string; team?: string; role?: string }
): Promise<Outcome> {
  const named = nameForm.safeParse({ name: name ?? '' });
  if (!named.success) return wrong('Give a name with --name.');
  if ((team === undefined) !== (role === undefined)) return wrong('Give --team and --role together.');
  if (role !== undefined && !ROLES.includes(role as Role)) return wrong(`There is no role "${role}".`);
  // 120 bits, twenty letters: shown once, kept as a hash.
  const password = randomBytes(15).toString('base64url');
  const member = team === undefined ? undefined : { slug: team, role: role as Role };
  const added = await addPerson(db, { email, name: named.data.name, password, member });
  if (!added.ok && added.reason === 'unknown-team')
    return { code: 1, text: `There is no team /team/${team}.` };
  if (!added.ok) return { code: 1, text: `${email} is in that team already; nothing is changed.` };
  const where = member ? `, ${member.role} of /team/${member.slug}` : '';
  if (!added.made)
    return { code: 0, text: `${email} has an account and keeps its name and password${where}.` };
  return { code: 0, text: `${email} can sign in${where}. The password, shown this once:\n${password}` };
}
