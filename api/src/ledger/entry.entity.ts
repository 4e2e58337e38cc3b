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
import { Person } from '../people/person.entity';

/** What an entry was made for. */
export type SourceKind =
  'opening' | 'invoice' | 'payment' | 'credit used' | 'statement line' | 'correction' | 'journal';

/**
 * One entry of the journal. Never changed and never deleted (triggers); its postings sum to zero (deferred trigger).
 * A correction is an entry that reverses another, which can happen once.
 */
@Entity()
@Unique('entry_reversed_once', ['reversesId'])
@Index('entry_by_day', ['occurredOn'])
@Index('entry_by_source', ['sourceKind', 'sourceId'])
@Check('entry_posting_count', `posting_count >= 2`)
@Check('entry_description_present', `length(btrim(description)) > 0`)
export class Entry {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('date')
  occurredOn: string;

  @Column('text')
  description: string;

  @Column('text')
  sourceKind: SourceKind;

  @Column('uuid', { nullable: true })
  sourceId: string | null;

  @Column('uuid', { nullable: true })
  reversesId: string | null;

  @ManyToOne(() => Entry, { nullable: true })
  @JoinColumn({ name: 'reverses_id', foreignKeyConstraintName: 'entry_reverses_entry' })
  reverses: Relation<Entry> | null;

  /** Written with the entry, so that a posting added afterwards is one too many. */
  @Column('smallint')
  postingCount: number;

  @Column('uuid', { nullable: true })
  madeById: string | null;

  @ManyToOne(() => Person, { nullable: true })
  @JoinColumn({ name: 'made_by_id', foreignKeyConstraintName: 'entry_made_by_person' })
  madeBy: Relation<Person> | null;

  @Column('timestamptz')
  recordedAt: Date;
}
