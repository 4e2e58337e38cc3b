import { Check, Column, Entity, Index, PrimaryColumn } from 'typeorm';

export const EVENT_OUTCOMES = ['acted', 'noted', 'needs a look'] as const;
export type EventOutcome = (typeof EVENT_OUTCOMES)[number];

/** An event of the card service, claimed by its id before it is acted on: however often it comes, it counts once. */
@Entity()
@Index('payment_event_needs_a_look', ['receivedAt'], { where: `outcome = 'needs a look'` })
@Check('payment_event_outcome_known', `outcome IN ('acted', 'noted', 'needs a look')`)
export class PaymentEvent {
  /** The card service's own id. */
  @PrimaryColumn('text')
  id: string;

  @Column('text')
  type: string;

  @Column('timestamptz')
  receivedAt: Date;

  @Column('text', { default: 'noted' })
  outcome: EventOutcome;

  /** What the treasurer should know of it. */
  @Column('text', { default: '' })
  note: string;
}
