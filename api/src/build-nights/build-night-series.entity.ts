import { Check, Column, Entity, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Person } from '../people/person.entity';

/** Nights that were planned together by one rule. */
@Entity()
@Check('build_night_series_title_present', `length(btrim(title)) > 0`)
export class BuildNightSeries {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** `Larkmoor Twenty` */
  @Column('text')
  title: string;

  /** The RRULE of RFC 5545, as it was asked for; read on the club's wall clock. */
  @Column('text')
  rule: string;

  @Column('uuid')
  madeById: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'made_by_id', foreignKeyConstraintName: 'build_night_series_made_by_person' })
  madeBy: Relation<Person>;

  @Column('timestamptz')
  madeAt: Date;
}
