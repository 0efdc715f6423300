import { originalFile } from '$lib/server/db/schema';
import { storeFile } from '$lib/server/services/datasets/store-file';
import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { setting } from './support';

const bytes = Uint8Array.from([0xff, 0xfe, 0, 1, 13, 10, 200]);

describe('storeFile', () => {
  it('keeps bytes as they are, once per team', () => {
    const { db, lead, experimenter, stranger } = setting();
    const first = storeFile(db, lead, { name: 'a.csv', bytes }, 5);
    const again = storeFile(db, experimenter, { name: 'b.csv', bytes }, 6);
    const theirs = storeFile(db, stranger, { name: 'a.csv', bytes });
    if (!first.ok || !again.ok || !theirs.ok) throw new Error('refused');
    expect(first.fresh).toBe(true);
    expect(again).toEqual({ ok: true, file: first.file, fresh: false });
    expect(theirs.file.id).not.toBe(first.file.id);
    const rows = db.select().from(originalFile).all();
    expect(rows).toHaveLength(2);
    expect(Buffer.compare(rows[0].bytes, Buffer.from(bytes))).toBe(0);
    expect(rows[0].sha256).toBe(createHash('sha256').update(bytes).digest('hex'));
    db.$client.close();
  });

  it('refuses an observer, nothing, and more than the limit', () => {
    const { db, lead, observer } = setting();
    expect(storeFile(db, observer, { name: 'a', bytes })).toEqual({ ok: false, reason: 'not-allowed' });
    expect(storeFile(db, lead, { name: 'a', bytes: new Uint8Array() })).toEqual({
      ok: false,
      reason: 'empty'
    });
    const large = new Uint8Array(20 * 1024 * 1024 + 1);
    expect(storeFile(db, lead, { name: 'a', bytes: large })).toEqual({ ok: false, reason: 'too-large' });
    expect(db.select().from(originalFile).all()).toEqual([]);
    db.$client.close();
  });
});
