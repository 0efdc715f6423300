import type { TeamDelivery, TeamWebhook } from '../webhooks/team-webhook';
import { isoMoment } from './shapes/moment';
import type { ApiDelivery, ApiWebhook } from './shapes/webhook';

const moment = (at: number | null): string | null => (at === null ? null : isoMoment(at));

/** A webhook as the API tells it. */
export const toWebhook = (webhook: TeamWebhook): ApiWebhook => ({
  ...webhook,
  createdAt: isoMoment(webhook.createdAt),
  restingSince: moment(webhook.restingSince),
  lastSentAt: moment(webhook.lastSentAt)
});

/** A message as the API tells it. */
export const toDelivery = ({ eventId, dueAt, createdAt, endedAt, ...rest }: TeamDelivery): ApiDelivery => ({
  ...rest,
  event: eventId,
  nextTryAt: moment(dueAt),
  createdAt: isoMoment(createdAt),
  endedAt: moment(endedAt)
});
