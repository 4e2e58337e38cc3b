import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { minorUnits } from '../common/minor-units';
import { Invoice } from './invoice.entity';

/** `confirming`: the card was taken, the bank has yet to say that the money comes. */
export type CheckoutState = 'open' | 'confirming' | 'paid' | 'failed' | 'expired';

/** A visit to the card service's page to pay one invoice. An invoice has one live visit at a time. */
@Entity()
@Unique('checkout_session_once', ['sessionId'])
@Index('checkout_one_live', ['invoiceId'], { unique: true, where: `state IN ('open', 'confirming')` })
@Check('checkout_amount_positive', `amount_minor > 0`)
@Check('checkout_state_known', `state IN ('open', 'confirming', 'paid', 'failed', 'expired')`)
export class Checkout {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  invoiceId: string;

  @ManyToOne(() => Invoice, { nullable: false })
  @JoinColumn({ name: 'invoice_id', foreignKeyConstraintName: 'checkout_of_invoice' })
  invoice: Relation<Invoice>;

  @Column('bigint', { transformer: minorUnits })
  amountMinor: number;

  @Column('text')
  currency: string;

  /** Null until the card service has answered. */
  @Column('text', { nullable: true })
  sessionId: string | null;

  @Column('text', { nullable: true })
  url: string | null;

  @Column('text', { default: 'open' })
  state: CheckoutState;

  @Column('timestamptz')
  openedAt: Date;

  @Column('timestamptz')
  changedAt: Date;
}
