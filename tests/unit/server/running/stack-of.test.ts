import { freshDatabase } from '../../../support/fresh-database';
import { newToken } from '$lib/server/auth/new-token';
import { person } from '$lib/server/db/schema';
import { stackOf } from '$lib/server/running/stack-of';
import { DrizzleQueryError } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';

describe('stackOf', () => {
  it('holds the place and the causes of an error', () => {
    const text = stackOf(new Error('no report', { cause: new Error('no disk') }));
    expect(text).toMatch(/^Error: no report\n +at .*stack-of\.test/);
    expect(text).toMatch(/\ncaused by Error: no disk\n +at /);
    expect(stackOf('thrown text')).toBe('thrown text');
  });

  it('leaves out what was to be written into the database', () => {
    const words = ['Ada\n    Lovelace', 'ada@example.org', '$argon2id$v=19$m=19456,t=2,p=1$c2FsdA$aGFzaA'];
    const error = new DrizzleQueryError('insert into person values (?, ?, ?)', words, new Error('busy'));
    const text = stackOf(error);
    expect(text).toContain('insert into person');
    expect(text).toContain('caused by Error: busy');
    for (const word of words) expect(text).not.toContain(word);
    expect(text).not.toContain('Lovelace');
  });

  it('leaves out what the driver itself says of a row', () => {
    const db = freshDatabase();
    const row = { id: 'x', email: 'ada@example.org', name: 'Ada Secret', createdAt: 1 };
    const twice = () => db.insert(person).values([row, row]).run();
    let said = '';
    try {
      twice();
    } catch (error) {
      said = stackOf(error);
    }
    expect(said).toMatch(/UNIQUE/);
    expect(said).not.toMatch(/ada@|Ada Secret/);
  });

  it('leaves out tokens and mail addresses that an error repeats', () => {
    const { token } = newToken();
    const said = stackOf(
      `no ${token}, sev_a1b2c3d4_${token}, whsec_${token}= nor <ada.b+c@mail.example.org>`
    );
    expect(said).toBe('no …, …, … nor <…>');
  });
});
