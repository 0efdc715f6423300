import { pdfOfSweep } from '$lib/server/services/sweeps/pdf-of-sweep';
import { putSweepAside } from '$lib/server/services/sweeps/put-sweep-aside';
import { expect, it } from 'vitest';
import { asked, free, makeQuench, saved, setting } from '../../../../support/sweeps';

it('the PDF of a sweep is for its team alone, named after it, and not for what is put aside', async () => {
  const { db, maker, observer, stranger } = setting();
  const id = saved(db, maker, asked(makeQuench(db, maker, free, 1), { name: 'Ours' }));
  const made = await pdfOfSweep(db, observer, id, 'https://counts.example/team/bay/sweeps/1');
  expect(made).toMatchObject({ ok: true, name: 'Ours' });
  expect(made.ok && Buffer.from(made.bytes.subarray(0, 5)).toString()).toBe('%PDF-');
  const unknown = { ok: false, reason: 'unknown' };
  for (const actor of [stranger, { ...stranger, teamId: maker.teamId }])
    expect(await pdfOfSweep(db, actor, id, null)).toEqual(unknown);
  putSweepAside(db, maker, id);
  expect(await pdfOfSweep(db, maker, id, null)).toEqual(unknown);
});
