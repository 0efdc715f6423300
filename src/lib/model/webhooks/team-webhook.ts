import type { ToldAction } from './told-actions';

/** How a message stands: it waits for its next try, was taken by its receiver, or is tried no more. */
export const DELIVERY_STATUSES = ['waiting', 'sent', 'given-up'] as const;
export type DeliveryStatus = (typeof DELIVERY_STATUSES)[number];

/** A webhook as its team's leads see it; never its secret. */
export interface TeamWebhook {
  id: string;
  name: string;
  url: string;
  actions: ToldAction[];
  /** Who made it; null when they are gone. */
  by: string | null;
  createdAt: number;
  restingSince: number | null;
  restingWhy: string | null;
  /** Messages that wait. */
  waiting: number;
  /** When the last message was taken by its receiver; null when none was in the last 30 days. */
  lastSentAt: number | null;
}

/** One message and what came of it. */
export interface TeamDelivery {
  id: string;
  /** Number of its event: messages go out in this order. */
  eventId: number;
  action: string;
  body: string;
  status: DeliveryStatus;
  attempts: number;
  /** When it is tried next; null when it is not. */
  dueAt: number | null;
  /** HTTP status of the last answer. */
  answered: number | null;
  trouble: string | null;
  createdAt: number;
  endedAt: number | null;
}
