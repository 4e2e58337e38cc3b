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
import { BuildGroup } from '../groups/build-group.entity';
import { Person } from '../people/person.entity';
import { PlanCheck } from '../plans/plan-check.entity';

export type BookingKind = 'session' | 'build night';

/** Benches and instruments held together for one stretch of time; what is held stands in its items, one at least. */
@Entity()
@Index('booking_by_start', ['startsAt'])
@Index('booking_of_person', ['personId', 'startsAt'])
@Check('booking_kind_known', `kind IN ('session', 'build night')`)
@Check('booking_times_ordered', `starts_at < ends_at`)
@Check('booking_holds_unless_cancelled', `holds = (cancelled_at IS NULL OR cancelled_at > starts_at)`)
@Unique('booking_as_held', ['id', 'startsAt', 'endsAt', 'holds'])
@Check('booking_night_named', `kind = 'session' OR length(btrim(title)) > 0`)
export class Booking {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  kind: BookingKind;

  /** What stands on the block of a build night; empty for a session. */
  @Column('text', { default: '' })
  title: string;

  /** Whose session it is, or who planned the night. */
  @Column('uuid')
  personId: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'booking_person_exists' })
  person: Relation<Person>;

  @Column('uuid', { nullable: true })
  groupId: string | null;

  @ManyToOne(() => BuildGroup, { nullable: true })
  @JoinColumn({ name: 'group_id', foreignKeyConstraintName: 'booking_group_exists' })
  group: Relation<BuildGroup> | null;

  /** The check of the plan it was made for. */
  @Column('uuid', { nullable: true })
  checkId: string | null;

  @ManyToOne(() => PlanCheck, { nullable: true })
  @JoinColumn({ name: 'check_id', foreignKeyConstraintName: 'booking_check_exists' })
  check: Relation<PlanCheck> | null;

  @Column('timestamptz')
  startsAt: Date;

  /** When it ends; when one that runs is cancelled, the moment of that. */
  @Column('timestamptz')
  endsAt: Date;

  @Column('timestamptz')
  madeAt: Date;

  @Column('timestamptz', { nullable: true })
  cancelledAt: Date | null;

  /** False when it was cancelled before it began; one cut short holds until then. */
  @Column('boolean', { default: true })
  holds: boolean;

  @Column('uuid', { nullable: true })
  cancelledById: string | null;

  @ManyToOne(() => Person, { nullable: true })
  @JoinColumn({ name: 'cancelled_by_id', foreignKeyConstraintName: 'booking_canceller_exists' })
  cancelledBy: Relation<Person> | null;
}
