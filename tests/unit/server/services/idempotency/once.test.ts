import { idempotentAnswer } from '$lib/server/db/schema';
import { once, REMEMBERED } from '$lib/server/services/idempotency/once';
import { makeToken } from '$lib/server/services/tokens/make-token';
import { beforeEach, describe, expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { dataset } from '$lib/server/db/schema';

let db: ReturnType<typeof freshDatabase>;
let actor: ReturnType<typeof makeMember>;
let tokens: string[];
let runs: number;

beforeEach(() => {
  db = freshDatabase();
  actor = makeMember(db, makeTeam(db).id, 'lead');
  tokens = [1, 2].map(() => {
    const form = { name: 'x', role: 'lead' as const, scopes: ['read' as const], days: 1 };
    const made = makeToken(db, actor, form);
    if (!made.ok) throw new Error(made.reason);
    return made.id;
  });
  runs = 0;
});

const answer = () => ({ status: 201, location: '/x', body: `{"run":${runs}}` });
function work() {
  runs += 1;
  return { done: answer() };
}

describe('once', () => {
  it('does the work once for a key, and gives the first answer again', () => {
    const asked = { tokenId: tokens[0], key: 'a', fingerprint: 'f' };
    expect(once(db, asked, work, 1000)).toMatchObject({
      ok: true,
      again: false,
      answer: { body: '{"run":1}' }
    });
    expect(once(db, asked, work, 2000)).toMatchObject({
      ok: true,
      again: true,
      answer: { body: '{"run":1}' }
    });
    expect(once(db, { ...asked, fingerprint: 'g' }, work, 2000)).toEqual({
      ok: false,
      reason: 'other-request'
    });
    expect(runs).toBe(1);
    once(db, { ...asked, key: 'b' }, work, 2000);
    once(db, { ...asked, tokenId: tokens[1] }, work, 2000);
    expect(runs).toBe(3);
  });

  it('forgets a key after a day', () => {
    const asked = { tokenId: tokens[0], key: 'a', fingerprint: 'f' };
    once(db, asked, work, 1000);
    expect(once(db, asked, work, 999 + REMEMBERED)).toMatchObject({ again: true });
    expect(once(db, asked, work, 1000 + REMEMBERED)).toMatchObject({ again: false });
    expect(runs).toBe(2);
  });

  it('leaves the key free after a refusal', () => {
    const asked = { tokenId: tokens[0], key: 'a', fingerprint: 'f' };
    expect(once(db, asked, () => ({ refused: 'no' }))).toEqual({
      ok: false,
      reason: 'refused',
      refusal: 'no'
    });
    expect(once(db, { ...asked, fingerprint: 'mended' }, work)).toMatchObject({ ok: true, again: false });
  });

  it('takes the work back when it fails halfway: neither done nor remembered', () => {
    const asked = { tokenId: tokens[0], key: 'a', fingerprint: 'f' };
    const broken = () => {
      db.transaction(() => makeDataset(db, actor), { behavior: 'immediate' });
      throw new Error('power cut');
    };
    expect(() => once(db, asked, broken)).toThrow('power cut');
    expect(db.select().from(dataset).all()).toEqual([]);
    expect(db.select().from(idempotentAnswer).all()).toEqual([]);
  });
});
