import { membership } from '$lib/server/db/schema';
import { BREATH } from '$lib/server/services/watches/due';
import { describe, expect, it } from 'vitest';
import { makeTeam } from '../../../../support/people';
import { DAY, HOUR, NOW, watchSetting } from './setting';

describe('what is told at once', () => {
  it('is what was chosen, since it was chosen, once, with a link to the thing', async () => {
    const { ada, sent, watches, gate, happens, tell } = watchSetting();
    gate('before');
    watches();
    gate('ebb 3.3');
    happens('job.fail', 'j');
    await tell();
    await tell(NOW + DAY);
    expect(sent).toHaveLength(1);
    expect(sent[0].to).toBe(`${ada.personId}@example.org`);
    expect(sent[0].subject).toBe('Version “ebb 3.3” of Marram failed its gate (Team bay-side)');
    expect(sent[0].text).toContain('https://counts.example/team/bay-side/devices/dev/versions/id-ebb 3.3');
    expect(sent[0].text).not.toContain('before');
    expect(sent[0].text).toContain(sent[0].unsubscribe);
  });

  it('comes in one mail for what happens within ten minutes', async () => {
    const { sent, watches, gate, tell } = watchSetting();
    watches();
    gate('first');
    await tell();
    gate('second');
    gate('third');
    await tell(NOW + BREATH - 1);
    expect(sent).toHaveLength(1);
    await tell(NOW + BREATH);
    expect(sent).toHaveLength(2);
    expect(sent[1].subject).toBe('2 things happened in Team bay-side');
    expect(sent[1].text).toMatch(/second.*third/s);
  });

  it('does not wait for a clock that was set back', async () => {
    const { sent, watches, gate, tell } = watchSetting();
    watches();
    gate('first');
    await tell();
    gate('second');
    await tell(NOW - 365 * DAY);
    expect(sent).toHaveLength(2);
  });

  it('tells of a kind chosen later from then on, and keeps its place in the others', async () => {
    const { ada, sent, watches, gate, happens, tell } = watchSetting();
    watches({ rhythm: 'daily' });
    happens('job.fail', 'early');
    gate('kept');
    watches({ about: ['gate-fail', 'job-end'] }, ada, NOW + 1);
    happens('job.fail', 'late');
    await tell(NOW + 2);
    expect(sent[0].subject).toBe('2 things happened in Team bay-side');
    expect(sent[0].text.match(/failed:/g)).toHaveLength(1);
    expect(sent[0].text).toContain('kept');
  });
});

describe('what is told once a day', () => {
  it('is one mail for all teams after the hour, and none where nothing happened', async () => {
    const { db, ada, sent, watches, gate, tell } = watchSetting();
    const other = makeTeam(db, 'lagoon').id;
    db.insert(membership)
      .values({ teamId: other, personId: ada.personId, role: 'observer', createdAt: 1 })
      .run();
    watches({ rhythm: 'daily' });
    watches({ rhythm: 'daily' }, ada, NOW, 'lagoon');
    gate('first');
    gate('second', { teamId: other });
    await tell(NOW + HOUR);
    expect(sent).toEqual([]);
    const next = Date.UTC(2026, 2, 15, 7);
    await tell(next - 1);
    expect(sent).toEqual([]);
    await tell(next);
    await tell(next + HOUR);
    expect(sent.map(({ subject }) => subject)).toEqual(['2 things happened in Team bay-side, Team lagoon']);
    await tell(next + DAY);
    expect(sent).toHaveLength(1);
    // Nothing for three days, then something in the afternoon: it waits for the morning.
    gate('third');
    await tell(next + 2 * DAY);
    await tell(next + 4 * DAY);
    expect(sent).toHaveLength(2);
  });

  it('waits for the morning also when days without anything went by', async () => {
    const { sent, watches, gate, tell } = watchSetting();
    watches({ rhythm: 'daily' });
    for (let day = 1; day < 4; day++) await tell(Date.UTC(2026, 2, 14 + day, 7));
    gate('late');
    await tell(Date.UTC(2026, 2, 17, 15));
    expect(sent).toEqual([]);
    await tell(Date.UTC(2026, 2, 18, 7));
    expect(sent).toHaveLength(1);
  });
});
