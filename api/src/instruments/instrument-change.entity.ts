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
import { Person } from '../people/person.entity';
import { Instrument } from './instrument.entity';

export const CHANGED = ['condition', 'calibration'] as const;

/** One line of an instrument's history: who changed what, when, and why. Never rewritten. */
@Entity()
@Index('instrument_change_of_instrument', ['instrumentId', 'changedAt'])
@Check('instrument_change_known', `changed IN ('condition', 'calibration')`)
export class InstrumentChange {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  instrumentId: string;

  @ManyToOne(() => Instrument, { nullable: false })
  @JoinColumn({ name: 'instrument_id', foreignKeyConstraintName: 'instrument_change_instrument_exists' })
  instrument: Relation<Instrument>;

  @Column('uuid')
  changedById: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'changed_by_id', foreignKeyConstraintName: 'instrument_change_person_exists' })
  changedBy: Relation<Person>;

  @Column('timestamptz')
  changedAt: Date;

  @Column('text')
  changed: (typeof CHANGED)[number];

  /** A condition or a day; null for a calibration date that was not set. */
  @Column('text', { nullable: true })
  before: string | null;

  @Column('text', { nullable: true })
  after: string | null;

  @Column('text', { default: '' })
  note: string;
}
