import { z } from 'zod';
import { DELIVERY_STATUSES } from '../../webhooks/team-webhook';
import { webhookFormSchema } from '../../webhooks/webhook-form';
import { momentSchema } from './moment';

const actions = webhookFormSchema.shape.actions.describe('What it is told of, by the names of the events');

/** A webhook of the team, without its secret. */
export const webhookSchema = z.object({
  id: z.string(),
  name: z.string(),
  url: z.string(),
  actions,
  by: z.string().nullable().describe('Who made it'),
  createdAt: momentSchema,
  restingSince: momentSchema.nullable().describe('Nothing is sent while it rests; null when it is awake'),
  restingWhy: z.string().nullable(),
  waiting: z.int().describe('Messages that wait'),
  lastSentAt: momentSchema.nullable().describe('When the last message was taken, within 30 days')
});
export type ApiWebhook = z.infer<typeof webhookSchema>;

export const newWebhookSchema = z.strictObject({ ...webhookFormSchema.shape, actions });

export const madeWebhookSchema = webhookSchema.extend({
  secret: z
    .string()
    .nullable()
    .describe('Key of the signatures, in this answer alone: null when the same Idempotency-Key comes again')
});

/** One message and what came of it. */
export const deliverySchema = z.object({
  id: z.string().describe('The same at every attempt: the header field webhook-id'),
  event: z.int().describe('Number of the event: messages go out in this order'),
  action: z.string(),
  status: z.enum(DELIVERY_STATUSES),
  attempts: z.int(),
  nextTryAt: momentSchema.nullable(),
  answered: z.int().nullable().describe('HTTP status of the last answer'),
  trouble: z.string().nullable().describe('Why the last attempt failed'),
  body: z.string().describe('What is sent, byte for byte'),
  createdAt: momentSchema,
  endedAt: momentSchema.nullable().describe('When it was sent or given up; removed 30 days later')
});
export type ApiDelivery = z.infer<typeof deliverySchema>;
