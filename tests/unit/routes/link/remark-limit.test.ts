import { remark } from '$lib/server/db/schema';
import { describe, expect, it } from 'vitest';
import { takeRemark } from '../../../../src/routes/remark-answers';
import { remarkSetting } from '../../../support/remark-setting';

describe('remarks by a link', () => {
  it('are ten an hour for one reader, counted when they are kept', async () => {
    const { db, reportId, makeLink, referee } = await remarkSetting();
    const [one, two] = [makeLink(), makeLink()];
    const send = async (linkId: string, reader: string, body: string, signedAs = '') => {
      const author = referee(linkId, signedAs);
      const place = { db, author, reportId, address: 'https://counts.example/x', from: { linkId, reader } };
      const taken = await takeRemark(place, { section: 'law', body });
      return taken.ok ? 'kept' : taken.problem.status;
    };
    for (let i = 0; i < 10; i++) expect(await send(one, 'a', `remark ${i}`)).toBe('kept');
    expect(await send(one, 'a', 'one more')).toBe(429);
    expect(await send(one, 'b', 'of another browser')).toBe('kept');
    expect(await send(two, 'a', 'by another link')).toBe('kept');
    // Sent twice, or refused for another reason: not counted.
    for (let i = 0; i < 12; i++) expect(await send(two, 'b', 'twice')).toBe('kept');
    for (let i = 0; i < 12; i++) expect(await send(two, 'b', `x ${i}`, 'The team')).toBe(400);
    expect(await send(two, 'b', 'still')).toBe('kept');
    expect(db.select().from(remark).all()).toHaveLength(14);
  });

  it('are sixty an hour for all readers of a link, so that new cookies do not help', async () => {
    const { db, reportId, makeLink, referee } = await remarkSetting();
    const linkId = makeLink();
    const statuses: (number | string)[] = [];
    for (let i = 0; i < 61; i++) {
      const place = {
        db,
        author: referee(linkId),
        reportId,
        address: 'x',
        from: { linkId, reader: `visit ${i}` }
      };
      const taken = await takeRemark(place, { section: 'law', body: `remark ${i}` });
      statuses.push(taken.ok ? 'kept' : taken.problem.status);
    }
    expect(statuses.slice(0, 60).every((status) => status === 'kept')).toBe(true);
    expect(statuses[60]).toBe(429);
  });
});
