import { actionLabel, EVENT_ACTIONS, eventWords } from '$lib/model/team/event-words';
import { describe, expect, it } from 'vitest';
import { sourceFiles } from '../../../support/source-files';

describe('eventWords', () => {
  it.each(EVENT_ACTIONS)('%s reads as a sentence, also when every name is gone', (action) => {
    const words = eventWords({ action, who: null, thing: null, detail: {} });
    expect(words).toMatch(/^[A-Z]/);
    expect(words).not.toMatch(/null|\[object|\.$/);
    expect(actionLabel(action)).not.toMatch(/[.]/);
  });

  it('falls back on the name of an action that has no words', () => {
    expect(eventWords({ action: 'moon.bulk-phase', who: 'Ada', thing: null, detail: {} })).toBe(
      'Ada: moon bulk phase'
    );
  });

  it('has a sentence for every action of a team that the source records', () => {
    const recorded = sourceFiles(['src/lib/server'])
      .flatMap(({ text }) => [...text.matchAll(/action: '([a-z]+\.[a-z-]+)'/g)].map(([, action]) => action))
      // What a person does outside any team is no event of a team.
      .filter((action) => !/^(person|account)\./.test(action));
    expect(recorded.length).toBeGreaterThan(10);
    expect([...new Set(recorded)].filter((action) => !EVENT_ACTIONS.includes(action))).toEqual([]);
  });
});
