import { capital } from '../capital';
import { DEVICE_SENTENCES } from './events/device-sentences';
import { byScript, many, role, type EventDetail, type Words } from './events/saying';
import { SCRIPT_SENTENCES } from './events/script-sentences';

/** An event with its names resolved. */
export interface EventFacts {
  action: string;
  /** Name of who did it; null for the program itself. */
  who: string | null;
  /** Name of what it was done to; null when it is gone or has none. */
  thing: string | null;
  detail: EventDetail;
}

/** Every action that is recorded, one line each. */
const SENTENCES: Record<string, Words> = {
  'team.make': { label: 'team made', say: ({ who }) => `${who} made the team` },
  'team.rename': {
    label: 'team renamed',
    say: ({ who, detail }) => `${who} renamed the team from “${detail.from}” to “${detail.to}”`
  },
  'team.export': {
    label: 'team exported',
    say: ({ who, detail }) =>
      `${who} exported the team: ${many(detail.datasets, 'dataset')}, ${many(detail.reports, 'report')}`
  },
  'team.import': {
    label: 'archive imported',
    say: ({ who, detail }) =>
      `${who} imported an archive of “${detail.team}”: ${many(detail.datasets, 'dataset')}, ${many(detail.reports, 'report')}`
  },
  'member.add': {
    label: 'member added',
    say: ({ who, thing, detail }) =>
      `${who} added ${thing} to the team${detail.role ? ` as ${role(detail.role)}` : ''}`
  },
  'member.role': {
    label: 'role changed',
    say: ({ who, thing, detail }) =>
      `${who} made ${thing} ${role(detail.to)}, who was ${role(detail.from)} before`
  },
  'member.remove': {
    label: 'member removed',
    say: ({ who, thing }) => `${who} removed ${thing} from the team`
  },
  'member.leave': { label: 'member left', say: ({ who }) => `${who} left the team` },
  'invitation.make': {
    label: 'invitation',
    say: ({ who, detail }) => `${who} invited ${detail.email} as ${role(detail.role)}`
  },
  'invitation.resend': {
    label: 'invitation sent again',
    say: ({ who, detail }) => `${who} sent the invitation to ${detail.email} again`
  },
  'invitation.revoke': {
    label: 'invitation revoked',
    say: ({ who, detail }) => `${who} revoked the invitation to ${detail.email}`
  },
  'invitation.accept': {
    label: 'invitation accepted',
    say: ({ who, detail }) => `${who} accepted an invitation and is now ${role(detail.role)}`
  },
  ...SCRIPT_SENTENCES,
  'dataset.upload': {
    label: 'dataset saved',
    say: ({ who, thing, detail }) => `${who} saved ${thing}${byScript(detail)}`
  },
  'dataset.edit': {
    label: 'conditions changed',
    say: ({ who, thing }) => `${who} changed the conditions of ${thing}`
  },
  'dataset.bulk-edit': {
    label: 'conditions changed on many',
    say: ({ who, thing }) => `${who} changed the conditions of ${thing}, with others`
  },
  'dataset.aside': { label: 'dataset put aside', say: ({ who, thing }) => `${who} put ${thing} aside` },
  'dataset.restore': {
    label: 'dataset brought back',
    say: ({ who, thing }) => `${who} brought ${thing} back`
  },
  'dataset.purge': {
    label: 'dataset removed for good',
    say: ({ thing }) => `${capital(thing)} was removed for good, 30 days after it was put aside`
  },
  'dataset.import': {
    label: 'dataset imported',
    say: ({ who, thing, detail }) =>
      `${who} imported ${thing}${detail.madeBy ? `, first saved by ${detail.madeBy}` : ''}`
  },
  ...DEVICE_SENTENCES,
  'report.make': { label: 'report made', say: ({ who, thing }) => `${who} made ${thing}` },
  'report.import': {
    label: 'report imported',
    say: ({ who, thing, detail }) =>
      `${who} imported ${thing}${detail.madeBy ? `, first made by ${detail.madeBy}` : ''}`
  },
  'report.aside': { label: 'report put aside', say: ({ who, thing }) => `${who} put ${thing} aside` },
  'report.restore': { label: 'report brought back', say: ({ who, thing }) => `${who} brought ${thing} back` },
  'report.purge': {
    label: 'report removed for good',
    say: () => 'A report was removed for good, 30 days after it was put aside'
  },
  'sweep.make': {
    label: 'sweep saved',
    say: ({ who, thing, detail }) => `${who} saved ${thing}${byScript(detail)}`
  },
  'sweep.import': {
    label: 'sweep imported',
    say: ({ who, thing, detail }) =>
      `${who} imported ${thing}${detail.madeBy ? `, first made by ${detail.madeBy}` : ''}`
  },
  'sweep.aside': { label: 'sweep put aside', say: ({ who, thing }) => `${who} put ${thing} aside` },
  'sweep.restore': { label: 'sweep brought back', say: ({ who, thing }) => `${who} brought ${thing} back` },
  'sweep.purge': {
    label: 'sweep removed for good',
    say: ({ thing }) => `${capital(thing)} was removed for good, 30 days after it was put aside`
  },
  'site-map.make': {
    label: 'map of sites saved',
    say: ({ who, thing, detail }) => `${who} saved ${thing}${byScript(detail)}`
  },
  'site-map.aside': {
    label: 'map of sites put aside',
    say: ({ who, thing }) => `${who} put ${thing} aside`
  },
  'site-map.restore': {
    label: 'map of sites brought back',
    say: ({ who, thing }) => `${who} brought ${thing} back`
  },
  'site-map.purge': {
    label: 'map of sites removed for good',
    say: ({ thing }) => `${capital(thing)} was removed for good, 30 days after it was put aside`
  },
  'remark.add': { label: 'remark', say: ({ who, thing }) => `${who} remarked on ${thing}` },
  'remark.settle': {
    label: 'remark settled',
    say: ({ who, thing }) => `${who} settled a remark on ${thing}`
  },
  'remark.reopen': {
    label: 'remark reopened',
    say: ({ who, thing }) => `${who} reopened a remark on ${thing}`
  },
  'link.make': { label: 'link made', say: ({ who, thing }) => `${who} made ${thing}` },
  'link.revoke': { label: 'link closed', say: ({ who, thing }) => `${who} closed ${thing}` },
  'job.queue': {
    label: 'diagnosis asked for',
    say: ({ who, thing, detail }) => `${who} asked for ${thing}${byScript(detail)}`
  },
  'job.cancel': { label: 'diagnosis cancelled', say: ({ who, thing }) => `${who} cancelled ${thing}` },
  'job.fail': { label: 'diagnosis failed', say: ({ thing }) => `${capital(thing)} failed` }
};

/** Actions that have words, for the list of filters. */
export const EVENT_ACTIONS = Object.keys(SENTENCES);

/** What an action is called in a list. */
export const actionLabel = (action: string): string =>
  SENTENCES[action]?.label ?? action.replace(/[.-]/g, ' ');

/** What happened, as a sentence without its full stop. An action without words of its own is told by its name. */
export function eventWords({ action, who, thing, detail }: EventFacts): string {
  const words = SENTENCES[action];
  const by = who ?? 'The program';
  if (words) return words.say({ who: by, thing: thing ?? nameless(action), detail });
  return `${by}: ${actionLabel(action)}${thing ? `, ${thing}` : ''}`;
}

/** What cannot be named any more is still called what it was. */
const NAMELESS: Record<string, string> = {
  member: 'somebody',
  dataset: 'a dataset',
  report: 'a report',
  sweep: 'a sweep',
  remark: 'a report',
  link: 'a link',
  job: 'a diagnosis'
};

const nameless = (action: string) => NAMELESS[action.split('.')[0]] ?? 'something';
