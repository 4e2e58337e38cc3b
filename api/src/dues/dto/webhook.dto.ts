import { EVENT_OUTCOMES } from '../payment-event.entity';

export const WEBHOOK_OUTCOMES = [...EVENT_OUTCOMES, 'known'] as const;
export type WebhookOutcome = (typeof WEBHOOK_OUTCOMES)[number];

export class WebhookDto {
  /** The event's id. */
  received: string;
  /** `known`: it had come before, and nothing was done. */
  outcome: WebhookOutcome;
}
