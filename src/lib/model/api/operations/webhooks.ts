import { z } from 'zod';
import { DELIVERY_STATUSES } from '../../webhooks/team-webhook';
import type { Content, Operation } from '../operation';
import { pageOf, pageQuery } from '../shapes/page';
import { deliverySchema, madeWebhookSchema, newWebhookSchema, webhookSchema } from '../shapes/webhook';

export const deliveriesQuery = z.strictObject({
  ...pageQuery,
  status: z.enum(DELIVERY_STATUSES).optional().describe('Of this status alone')
});
export const webhookListSchema = pageOf(webhookSchema);
export const deliveryPageSchema = pageOf(deliverySchema);

const json = (schema: z.ZodType, about: string): Content => ({ type: 'application/json', schema, about });
const A_WEBHOOK = json(webhookSchema, 'A webhook');
const common = { part: 'Webhooks', scope: 'webhooks' } as const;

const KEY_REFUSALS = {
  400: 'The body did not arrive whole.',
  409: 'The first request with this key is still being answered.',
  422: 'The Idempotency-Key came with another request before.'
};

export const WEBHOOK_OPERATIONS: Operation[] = [
  {
    ...common,
    id: 'listWebhooks',
    method: 'get',
    path: '/webhooks',
    summary: 'List webhooks',
    about: 'Newest first. A team has at most 20: they come in one page.',
    answer: { status: 200, about: 'All of them', content: json(webhookListSchema, 'The webhooks') }
  },
  {
    ...common,
    id: 'makeWebhook',
    method: 'post',
    path: '/webhooks',
    summary: 'Make a webhook',
    about: 'It is told of what happens from now on, by messages signed after Standard Webhooks 1.0.',
    once: true,
    bodies: [
      {
        ...json(newWebhookSchema, 'Where it listens, and what it is told of'),
        example: { name: 'night shift', url: 'https://example.org/hook', actions: ['gate.fail', 'job.fail'] }
      }
    ],
    answer: {
      status: 201,
      about: 'Made',
      content: json(madeWebhookSchema, 'The webhook with its secret'),
      location: true
    },
    refusals: {
      400: 'The body did not arrive whole, or is not JSON.',
      409: 'The team has 20 webhooks, or the first request with this key is still being answered.',
      415: 'Not application/json.',
      422: 'Something does not fit: “errors” says where and why. Or the Idempotency-Key came with another request before.'
    }
  },
  {
    ...common,
    id: 'readWebhook',
    method: 'get',
    path: '/webhooks/{id}',
    summary: 'Read a webhook',
    idOf: 'webhook',
    answer: { status: 200, about: 'The webhook', content: A_WEBHOOK }
  },
  {
    ...common,
    id: 'listDeliveries',
    method: 'get',
    path: '/webhooks/{id}/deliveries',
    summary: 'List the messages of a webhook',
    about: 'The newest event first. Removed 30 days after they were sent or given up.',
    idOf: 'webhook',
    query: deliveriesQuery,
    answer: { status: 200, about: 'One page', content: json(deliveryPageSchema, 'A page of messages') }
  },
  {
    ...common,
    id: 'restWebhook',
    method: 'post',
    path: '/webhooks/{id}/rest',
    summary: 'Put a webhook to rest',
    about: 'Nothing is sent while it rests, and what happens meanwhile is not told later.',
    idOf: 'webhook',
    once: true,
    answer: { status: 200, about: 'It rests', content: A_WEBHOOK },
    refusals: KEY_REFUSALS
  },
  {
    ...common,
    id: 'wakeWebhook',
    method: 'post',
    path: '/webhooks/{id}/wake',
    summary: 'Wake a webhook',
    about: 'It is told of what happens from now on; messages that waited when it was put to rest are sent.',
    idOf: 'webhook',
    once: true,
    answer: { status: 200, about: 'It is awake', content: A_WEBHOOK },
    refusals: KEY_REFUSALS
  },
  {
    ...common,
    id: 'deleteWebhook',
    method: 'delete',
    path: '/webhooks/{id}',
    summary: 'Remove a webhook',
    about: 'For good, with its messages: those that wait are not sent.',
    idOf: 'webhook',
    answer: { status: 200, about: 'It is gone', content: json(webhookSchema, 'The webhook as it was') }
  }
];
