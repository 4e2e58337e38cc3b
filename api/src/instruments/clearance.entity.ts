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
import { InstrumentKind } from './instrument-kind.entity';

/** A steward's word that a member may use instruments of a kind. Renewing ends the old one and gives a new one. */
@Entity()
@Index('clearance_once', ['personId', 'kindId'], { unique: true, where: 'ended_at IS NULL' })
@Index('clearance_of_kind', ['kindId'])
@Check('clearance_days_ordered', `until IS NULL OR granted_on <= until`)
export class Clearance {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  personId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'clearance_person_exists' })
  person: Relation<Person>;

  @Column('uuid')
  kindId: string;

  @ManyToOne(() => InstrumentKind, { nullable: false })
  @JoinColumn({ name: 'kind_id', foreignKeyConstraintName: 'clearance_kind_exists' })
  kind: Relation<InstrumentKind>;

  @Column('uuid')
  grantedById: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'granted_by_id', foreignKeyConstraintName: 'clearance_granter_exists' })
  grantedBy: Relation<Person>;

  @Column('date')
  grantedOn: string;

  /** Last day on which it holds; null while nobody set an end. */
  @Column('date', { nullable: true })
  until: string | null;

  /** Taken back, or replaced by a newer one. */
  @Column('timestamptz', { nullable: true })
  endedAt: Date | null;

  @Column('uuid', { nullable: true })
  endedById: string | null;

  @ManyToOne(() => Person, { nullable: true })
  @JoinColumn({ name: 'ended_by_id', foreignKeyConstraintName: 'clearance_ender_exists' })
  endedBy: Relation<Person> | null;
}
