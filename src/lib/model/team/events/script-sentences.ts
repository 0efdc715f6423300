import { byScript, many, role, type Words } from './saying';

/** What is done with tokens and webhooks. */
export const SCRIPT_SENTENCES: Record<string, Words> = {
  'token.make': {
    label: 'token made',
    say: ({ who, detail }) =>
      `${who} made the token “${detail.name}” for scripts, as ${role(detail.role)}, for ${many(detail.days, 'day')}: ${detail.scopes}`
  },
  'webhook.make': {
    label: 'webhook made',
    say: ({ who, detail }) => `${who} made the webhook “${detail.name}”${byScript(detail)}`
  },
  'webhook.rest': {
    label: 'webhook put to rest',
    say: ({ who, detail }) =>
      detail.byHand
        ? `${who} put the webhook “${detail.name}” to rest${byScript(detail)}`
        : `The webhook “${detail.name}” was put to rest: its messages failed for a week`
  },
  'webhook.wake': {
    label: 'webhook woken',
    say: ({ who, detail }) => `${who} woke the webhook “${detail.name}”${byScript(detail)}`
  },
  'webhook.try': {
    label: 'trial message',
    say: ({ who, detail }) => `${who} asked for a trial message to the webhook “${detail.name}”`
  },
  'webhook.resend': {
    label: 'message sent again',
    say: ({ who, detail }) => `${who} asked to send a message to the webhook “${detail.name}” again`
  },
  'webhook.delete': {
    label: 'webhook removed',
    say: ({ who, detail }) => `${who} removed the webhook “${detail.name}”${byScript(detail)}`
  },
  'token.revoke': {
    label: 'token revoked',
    say: ({ who, detail }) => `${who} revoked the token “${detail.name}”`
  }
};
