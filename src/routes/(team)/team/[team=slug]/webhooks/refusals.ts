/** Why a webhook was not made. */
export const MAKING = {
  'inner-address':
    'This address lies inside the network of this server, where webhooks are not sent. Whoever runs the server can allow it (WEBHOOKS_INSIDE).',
  'too-many': 'This team has 20 webhooks. Remove one first.',
  'not-allowed': 'Your role in this team does not allow that.'
} as const;

/** Why a message was not sent. */
export const SENDING = {
  unknown: 'There is no such message here any more: they are kept for 30 days.',
  resting: 'This webhook rests: wake it first.',
  'too-soon': 'A trial message was asked for a moment ago. Its answer stands below.',
  'under-way': 'This message is being sent just now, or will be within a minute.'
} as const;
