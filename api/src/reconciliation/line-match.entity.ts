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
import { Payment } from '../dues/payment.entity';
import { Account } from '../ledger/account.entity';
import { Entry } from '../ledger/entry.entity';
import { Person } from '../people/person.entity';
import { StatementLine } from './statement-line.entity';

export const MATCHED_HOW = ['by itself', 'by hand'] as const;
export type MatchedHow = (typeof MATCHED_HOW)[number];

/**
 * What a statement line stands for in the books. Its entry moves the line's amount to the current account (trigger);
 * a line has one live match, a payment stands for one line.
 */
@Entity()
@Unique('line_match_has_its_entry', ['entryId'])
@Index('line_match_line_once', ['lineId'], { unique: true, where: 'taken_back_at IS NULL' })
@Index('line_match_payment_once', ['paymentId'], {
  unique: true,
  where: 'taken_back_at IS NULL AND payment_id IS NOT NULL',
})
@Check('line_match_how_known', `how IN ('by itself', 'by hand')`)
@Check('line_match_made_payment_is_there', `NOT made_payment OR payment_id IS NOT NULL`)
export class LineMatch {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  lineId: string;

  @ManyToOne(() => StatementLine, { nullable: false })
  @JoinColumn({ name: 'line_id', foreignKeyConstraintName: 'line_match_of_line' })
  line: Relation<StatementLine>;

  /** Null where the line was settled against an account. */
  @Column('uuid', { nullable: true })
  paymentId: string | null;

  @ManyToOne(() => Payment, { nullable: true })
  @JoinColumn({ name: 'payment_id', foreignKeyConstraintName: 'line_match_to_payment' })
  payment: Relation<Payment> | null;

  /** The payment was written down because of the line, so taking the match back takes it back too. */
  @Column('boolean')
  madePayment: boolean;

  @Column('uuid')
  entryId: string;

  @ManyToOne(() => Entry, { nullable: false })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'line_match_entry_exists' })
  entry: Relation<Entry>;

  /** The account it was settled against, where no payment is behind it. */
  @Column('text', { nullable: true })
  accountCode: string | null;

  @ManyToOne(() => Account, { nullable: true })
  @JoinColumn({ name: 'account_code', foreignKeyConstraintName: 'line_match_account_exists' })
  account: Relation<Account> | null;

  @Column('text', { default: '' })
  note: string;

  @Column('text')
  how: MatchedHow;

  @Column('text', { array: true, default: () => `'{}'` })
  reasons: string[];

  @Column('timestamptz')
  matchedAt: Date;

  @Column('uuid')
  matchedById: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'matched_by_id', foreignKeyConstraintName: 'line_match_by_person' })
  matchedBy: Relation<Person>;

  @Column('timestamptz', { nullable: true })
  takenBackAt: Date | null;

  @Column('uuid', { nullable: true })
  takenBackById: string | null;

  @ManyToOne(() => Person, { nullable: true })
  @JoinColumn({ name: 'taken_back_by_id', foreignKeyConstraintName: 'line_match_taken_back_by_person' })
  takenBackBy: Relation<Person> | null;
}
