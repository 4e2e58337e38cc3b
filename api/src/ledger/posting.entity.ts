import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { minorUnits } from '../common/minor-units';
import { Account } from './account.entity';
import { Entry } from './entry.entity';

/** One side of an entry: debits are positive, credits negative. */
@Entity()
@Index('posting_of_entry', ['entryId'])
@Index('posting_of_account', ['accountCode'])
@Check('posting_amount_not_zero', `amount_minor <> 0`)
@Check('posting_amount_exact', `abs(amount_minor) <= 9007199254740991`)
export class Posting {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  entryId: string;

  @ManyToOne(() => Entry, { nullable: false })
  @JoinColumn({ name: 'entry_id', foreignKeyConstraintName: 'posting_of_entry_exists' })
  entry: Relation<Entry>;

  @Column('text')
  accountCode: string;

  @ManyToOne(() => Account, { nullable: false })
  @JoinColumn({ name: 'account_code', foreignKeyConstraintName: 'posting_account_exists' })
  account: Relation<Account>;

  @Column('bigint', { transformer: minorUnits })
  amountMinor: number;
}
