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
import { PlanEdition } from '../plans/plan-edition.entity';

/** One member's transmitter, made to one edition of a plan. */
@Entity()
@Unique('build_serial_once', ['planId', 'serial'])
@Index('build_one_live', ['personId', 'planId'], { unique: true, where: 'ended_at IS NULL' })
@Check('build_serial_positive', `serial > 0`)
@Check('build_licence_named', `(licence_seen_at IS NULL) = (licence_seen_by_id IS NULL)`)
export class Build {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  personId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'build_of_person' })
  person: Relation<Person>;

  @Column('uuid')
  editionId: string;

  @Column('uuid')
  planId: string;

  @ManyToOne(() => PlanEdition, { nullable: false })
  @JoinColumn([
    { name: 'edition_id', referencedColumnName: 'id', foreignKeyConstraintName: 'build_to_edition' },
    { name: 'plan_id', referencedColumnName: 'planId', foreignKeyConstraintName: 'build_to_edition' },
  ])
  edition: Relation<PlanEdition>;

  /** The club's number for it, counted for each plan: 7 is shown as `serial 07`. */
  @Column('integer')
  serial: number;

  @Column('timestamptz')
  startedAt: Date;

  /** Finished or given up; a live build has none. */
  @Column('timestamptz', { nullable: true })
  endedAt: Date | null;

  /** When an organiser saw a licence that covers what this transmitter does on the air. */
  @Column('timestamptz', { nullable: true })
  licenceSeenAt: Date | null;

  @Column('uuid', { nullable: true })
  licenceSeenById: string | null;

  @ManyToOne(() => Person, { nullable: true })
  @JoinColumn({ name: 'licence_seen_by_id', foreignKeyConstraintName: 'build_licence_seen_by' })
  licenceSeenBy: Relation<Person> | null;
}
