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
import { Person } from '../people/person.entity';

export const METHODS = ['card', 'cash', 'cheque', 'transfer'] as const;
export type Method = (typeof METHODS)[number];

/** Money received from somebody. The receipt bears its number. */
@Entity()
@Unique('payment_receipt_number_once', ['receiptNumber'])
@Unique('payment_client_key_once', ['clientKey'])
@Unique('payment_card_session_once', ['cardSessionId'])
@Unique('payment_has_its_entry', ['entryId'])
@Index('payment_of_person', ['personId'])
@Index('payment_by_day', ['receivedOn'])
@Check('payment_amount_positive', `amount_minor > 0 AND amount_minor <= 9007199254740991`)
@Check('payment_method_known', `method IN ('card', 'cash', 'cheque', 'transfer')`)
@Check('payment_card_has_session', `(method = 'card') = (card_session_id IS NOT NULL)`)
@Check('payment_at_bank_by_transfer_or_cheque', `banked_on IS NULL OR method IN ('transfer', 'cheque')`)
export class Payment {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** `R-0298` */
  @Column('text')
  receiptNumber: string;

  @Column('uuid')
  personId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'payment_from_person' })
  person: Relation<Person>;

  @Column('text')
  method: Method;

  @Column('bigint', { transformer: minorUnits })
  amountMinor: number;

  @Column('date')
  receivedOn: string;

  @Column('text', { default: '' })
  note: string;

  /** Who took it; null where a machine did. */
  @Column('uuid', { nullable: true })
  takenById: string | null;

  @ManyToOne(() => Person, { nullable: true })
  @JoinColumn({ name: 'taken_by_id', foreignKeyConstraintName: 'payment_taken_by_person' })
  takenBy: Relation<Person> | null;

  /** Chosen by the form that took it, so that a second press of the button takes nothing. */
  @Column('uuid', { nullable: true })
  clientKey: string | null;

  /** The card service's session: one session pays once, whatever is delivered about it. */
  @Column('text', { nullable: true })
  cardSessionId: string | null;

  /** Day of the bank statement's line it was matched to. */
  @Column('date', { nullable: true })
  bankedOn: string | null;

  @Column('uuid')
  entryId: string;

  @ManyToOne(() => Entry, { nullable: false })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'payment_entry_exists' })
  entry: Relation<Entry>;

  @Column('timestamptz')
  recordedAt: Date;

  @Column('timestamptz', { nullable: true })
  takenBackAt: Date | null;
}
