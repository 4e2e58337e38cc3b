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

export const INVOICE_KINDS = ['dues', 'course fee', 'kit'] as const;
export type InvoiceKind = (typeof INVOICE_KINDS)[number];

/** What a member owes for one thing. What is still open follows from the allocations; it is not stored. */
@Entity()
@Unique('invoice_number_once', ['number'])
@Unique('invoice_reference_once', ['reference'])
@Unique('invoice_has_its_entry', ['entryId'])
@Index('invoice_of_person', ['personId'])
@Index('invoice_by_due_day', ['dueOn'])
@Check('invoice_amount_positive', `amount_minor > 0 AND amount_minor <= 9007199254740991`)
@Check('invoice_due_after_issue', `due_on >= issued_on`)
@Check('invoice_kind_known', `kind IN ('dues', 'course fee', 'kit')`)
@Check('invoice_reference_form', `reference ~ '^RF[0-9]{2}[A-Z0-9]{1,21}$'`)
export class Invoice {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** `D-0412` */
  @Column('text')
  number: string;

  @Column('text')
  kind: InvoiceKind;

  @Column('uuid')
  personId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'invoice_to_person' })
  person: Relation<Person>;

  @Column('text')
  description: string;

  @Column('bigint', { transformer: minorUnits })
  amountMinor: number;

  @Column('date')
  issuedOn: string;

  @Column('date')
  dueOn: string;

  /** ISO 11649, without spaces. */
  @Column('text')
  reference: string;

  @Column('uuid')
  entryId: string;

  @ManyToOne(() => Entry, { nullable: false })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'invoice_entry_exists' })
  entry: Relation<Entry>;

  @Column('timestamptz')
  raisedAt: Date;
}
