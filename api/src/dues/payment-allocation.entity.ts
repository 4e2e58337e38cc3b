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
import { Entry } from '../ledger/entry.entity';
import { Invoice } from './invoice.entity';
import { Payment } from './payment.entity';

/**
 * How much of a payment pays which invoice. Never more than the invoice's amount nor the payment's (trigger). What a
 * payment leaves over is credit on account.
 */
@Entity()
@Index('payment_allocation_once', ['paymentId', 'invoiceId'], { unique: true, where: 'released_at IS NULL' })
@Index('payment_allocation_of_invoice', ['invoiceId'])
@Unique('payment_allocation_has_its_entry', ['creditEntryId'])
@Check('payment_allocation_positive', `amount_minor > 0`)
export class PaymentAllocation {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  paymentId: string;

  @ManyToOne(() => Payment, { nullable: false })
  @JoinColumn({ name: 'payment_id', foreignKeyConstraintName: 'payment_allocation_from_payment' })
  payment: Relation<Payment>;

  @Column('uuid')
  invoiceId: string;

  @ManyToOne(() => Invoice, { nullable: false })
  @JoinColumn({ name: 'invoice_id', foreignKeyConstraintName: 'payment_allocation_to_invoice' })
  invoice: Relation<Invoice>;

  @Column('bigint', { transformer: minorUnits })
  amountMinor: number;

  @Column('timestamptz')
  allocatedAt: Date;

  /** Set where credit on account was used later: that moved money in the books by an entry of its own. */
  @Column('uuid', { nullable: true })
  creditEntryId: string | null;

  @ManyToOne(() => Entry, { nullable: true })
  @JoinColumn({ name: 'credit_entry_id', foreignKeyConstraintName: 'payment_allocation_entry_exists' })
  creditEntry: Relation<Entry> | null;

  /** Given up because its payment was taken back. */
  @Column('timestamptz', { nullable: true })
  releasedAt: Date | null;
}
