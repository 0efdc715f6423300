import { storageTrouble } from '$lib/server/services/datasets/storage-trouble';
import Connection from 'better-sqlite3';
import { describe, expect, it } from 'vitest';
import { answering, bodyTrouble } from '../../../../src/routes/(team)/team/[team=slug]/datasets/answers';
import { attachment } from '../../../../src/routes/(team)/team/[team=slug]/datasets/attachment';
import { choicesOfForm } from '../../../../src/routes/(team)/team/[team=slug]/datasets/new/choices-of-form';

function form(entries: [string, string][]): FormData {
  const data = new FormData();
  for (const [name, value] of entries) data.append(name, value);
  return data;
}

describe('choicesOfForm', () => {
  it('takes what is chosen for this file and leaves the rest to the guess', () => {
    const data = form([
      ['a.format', 'shots'],
      ['a.header', 'no'],
      ['a.separator', ''],
      ['a.column.2', 'batch'],
      ['a.0.name', 'a dataset'],
      ['b.format', 'counts']
    ]);
    const columns = [{ column: 2, role: 'batch' }];
    expect(choicesOfForm(data, 'a.')).toEqual({ format: 'shots', header: false, columns });
    expect(choicesOfForm(form([['a.format', 'nonsense']]), 'a.')).toEqual({});
  });
});

describe('trouble with the database', () => {
  it('a full disk and a locked database are told; other errors stay errors', async () => {
    const db = new Connection(':memory:');
    db.exec('create table t (x); insert into t values (zeroblob(9000))');
    db.pragma('max_page_count = 1');
    let full: unknown;
    try {
      for (;;) db.exec('insert into t values (zeroblob(9000))');
    } catch (error) {
      full = error;
    }
    db.close();
    expect(storageTrouble(full)).toBe('full');
    expect(storageTrouble(new Error('wrapped', { cause: full }))).toBe('full');
    const busy = Object.assign(new Error('database is locked'), { code: 'SQLITE_BUSY_SNAPSHOT' });
    expect(storageTrouble(busy)).toBe('busy');
    const answer = answering(() => {
      throw busy;
    });
    expect([answer.status, answer.headers.get('content-type')]).toEqual([503, 'application/problem+json']);
    expect(await answer.json()).toMatchObject({ code: 'busy', title: expect.stringContaining('try again') });
    expect(storageTrouble(new Error('other'))).toBe(null);
    expect(() =>
      answering(() => {
        throw new Error('other');
      })
    ).toThrow('other');
  });

  it('a body over the limit is 413, one that broke off 400', () => {
    expect(bodyTrouble(Object.assign(new Error('x'), { status: 413 })).status).toBe(413);
    expect(bodyTrouble(new TypeError('x', { cause: { status: 413 } })).status).toBe(413);
    expect(bodyTrouble(new TypeError('terminated')).status).toBe(400);
  });
});

describe('attachment', () => {
  it('names a file in any script, and no header can be slipped in', () => {
    const { headers } = attachment('x', "Zählung 'a'.csv", 'text/csv');
    expect(headers.get('content-disposition')).toBe(
      "attachment; filename=\"Z_hlung 'a'.csv\"; filename*=UTF-8''Z%C3%A4hlung%20%27a%27.csv"
    );
  });
});
