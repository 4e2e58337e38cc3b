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
import { Person } from '../people/person.entity';

/** A statement of the current account as the bank gave it, without the lines an earlier one had brought. */
@Entity()
@Unique('bank_statement_position_once', ['position'])
@Check('bank_statement_days_in_order', `from_on <= to_on`)
export class BankStatement {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** 1, 2, 3 …: each opens where the one before closed. */
  @Column('integer')
  position: number;

  @Column('text')
  fileName: string;

  /** Day of its first line. */
  @Column('date')
  fromOn: string;

  @Column('date')
  toOn: string;

  @Column('bigint', { transformer: minorUnits })
  openingMinor: number;

  @Column('bigint', { transformer: minorUnits })
  closingMinor: number;

  /** Lines of the file that an earlier statement had brought. */
  @Column('integer')
  knownLines: number;

  @Column('timestamptz')
  importedAt: Date;

  @Column('uuid')
  importedById: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'imported_by_id', foreignKeyConstraintName: 'bank_statement_imported_by_person' })
  importedBy: Relation<Person>;
}
