import type { WatchForm } from '$lib/model/watches/watch-form';
import type { Database } from '$lib/server/db/client';
import type { Message, SendMail } from '$lib/server/mail/send-mail';
import type { Actor } from '$lib/server/services/access/actor';
import { recordEvent } from '$lib/server/services/events/record-event';
import { saveWatch } from '$lib/server/services/watches/save-watch';
import { tellWatchers } from '$lib/server/services/watches/tell-watchers';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

export const NOW = Date.UTC(2026, 2, 14, 15, 9, 26);
export const HOUR = 3_600_000;
export const DAY = 24 * HOUR;
export const SETTINGS = {
  origin: 'https://counts.example',
  serverSecret: 'an invented key, long enough for anything',
  hour: 7
};

/** A team with a lead and an experimenter, and what is needed to watch, do and tell. */
export function watchSetting() {
  const db: Database = freshDatabase();
  const teamId = makeTeam(db, 'bay-side').id;
  const ada = makeMember(db, teamId, 'lead');
  const ben = makeMember(db, teamId, 'experimenter');
  const sent: Message[] = [];
  const waiting = new Map<string, number>();
  /** What the mail server says; null: it takes the message. */
  const mail: { refuses: Exclude<SendMail, { ok: true }> | null } = { refuses: null };

  const watches = (form: Partial<WatchForm> = {}, who: Actor = ada, now = NOW, slug = 'bay-side') =>
    saveWatch(db, who.personId, slug, { about: ['gate-fail'], rhythm: 'at-once', ...form }, now);
  /** A gate that a version of this name failed. */
  const gate = (version: string, more: { personId?: string; teamId?: string } = {}) => {
    const detail = { device: 'Marram', deviceId: 'dev', version };
    recordEvent(db, { action: 'gate.fail', teamId, thing: `id-${version}`, detail, ...more }, NOW);
  };
  const happens = (action: string, thing: string, more: object = {}) =>
    recordEvent(db, { action, teamId, thing, ...more }, NOW);
  const tell = (now = NOW) =>
    tellWatchers(
      db,
      SETTINGS,
      waiting,
      (_db, message) => {
        if (mail.refuses === null) sent.push(message);
        return Promise.resolve(mail.refuses ?? { ok: true });
      },
      now
    );
  return { db, teamId, ada, ben, sent, mail, watches, gate, happens, tell };
}
