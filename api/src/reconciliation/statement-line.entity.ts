import {
  Check,
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { minorUnits } from '../common/minor-units';
import { BankStatement } from './bank-statement.entity';

/** One line of a bank statement; money in is positive. */
@Entity()
@Unique('statement_line_position_once', ['statementId', 'position'])
@Unique('statement_line_counted_once', ['fingerprint', 'occurrence'])
@Check('statement_line_amount_not_zero', `amount_minor <> 0`)
export class StatementLine {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  statementId: string;

  @ManyToOne(() => BankStatement, { nullable: false })
  @JoinColumn({ name: 'statement_id', foreignKeyConstraintName: 'statement_line_of_statement' })
  statement: Relation<BankStatement>;

  /** From 1, oldest first. */
  @Column('integer')
  position: number;

  @Column('date')
  day: string;

  @Column('text')
  description: string;

  @Column('bigint', { transformer: minorUnits })
  amountMinor: number;

  /** The account's balance after it, as the bank says. */
  @Column('bigint', { transformer: minorUnits })
  balanceMinor: number;

  /** What makes the same line recognisable in another file. */
  @Column('text')
  fingerprint: string;

  /** 2 for the second line of one file that looks the same in everything. */
  @Column('integer')
  occurrence: number;
}
