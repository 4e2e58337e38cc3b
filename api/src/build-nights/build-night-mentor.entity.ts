import { Column, Entity, Exclusion, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Person } from '../people/person.entity';
import { BuildNight } from './build-night.entity';

/**
 * A mentor on duty. The night's times are repeated here, and follow it by the foreign key, so that the database can
 * see to it that nobody is on duty twice at once.
 */
@Entity()
@Exclusion(
  'build_night_mentor_on_one_duty',
  `USING gist (person_id WITH =, tstzrange(starts_at, ends_at) WITH &&) WHERE (released_at IS NULL)`,
)
export class BuildNightMentor {
  @PrimaryColumn('uuid')
  nightId: string;

  @PrimaryColumn('uuid')
  personId: string;

  @ManyToOne(() => BuildNight, { nullable: false, onUpdate: 'CASCADE' })
  @JoinColumn([
    {
      name: 'night_id',
      referencedColumnName: 'id',
      foreignKeyConstraintName: 'build_night_mentor_of_night',
    },
    { name: 'starts_at', referencedColumnName: 'startsAt' },
    { name: 'ends_at', referencedColumnName: 'endsAt' },
  ])
  night: Relation<BuildNight>;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'build_night_mentor_is_person' })
  person: Relation<Person>;

  @Column('timestamptz')
  startsAt: Date;

  @Column('timestamptz')
  endsAt: Date;

  /** Set when the night is cancelled. */
  @Column('timestamptz', { nullable: true })
  releasedAt: Date | null;
}
