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
import { Booking } from '../bookings/booking.entity';
import { Person } from '../people/person.entity';
import { BuildNightSeries } from './build-night-series.entity';

/** A scheduled evening. Cancelled, it stays in the record. */
@Entity()
@Unique('build_night_times', ['id', 'startsAt', 'endsAt'])
@Unique('build_night_number_once', ['seriesId', 'number'])
@Unique('build_night_booking_once', ['bookingId'])
@Index('build_night_starts', ['startsAt'])
@Check('build_night_ends_after_start', `ends_at > starts_at`)
@Check('build_night_places_some', `places BETWEEN 1 AND 100`)
@Check('build_night_title_present', `length(btrim(title)) > 0`)
@Check('build_night_numbered_in_series', `(series_id IS NULL) = (number IS NULL)`)
@Check('build_night_cancelled_with_word', `(cancelled_at IS NULL) = (cancelled_reason IS NULL)`)
export class BuildNight {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid', { nullable: true })
  seriesId: string | null;

  @ManyToOne(() => BuildNightSeries, { nullable: true })
  @JoinColumn({ name: 'series_id', foreignKeyConstraintName: 'build_night_of_series' })
  series: Relation<BuildNightSeries> | null;

  /** Its place in the series, from 1; it keeps it when another is cancelled. */
  @Column('integer', { nullable: true })
  number: number | null;

  @Column('text')
  title: string;

  @Column('timestamptz')
  startsAt: Date;

  @Column('timestamptz')
  endsAt: Date;

  @Column('integer')
  places: number;

  @Column('text', { default: '' })
  note: string;

  /** Holds its benches in the bench book; null for a night without a bench. */
  @Column('uuid', { nullable: true })
  bookingId: string | null;

  @ManyToOne(() => Booking, { nullable: true })
  @JoinColumn({ name: 'booking_id', foreignKeyConstraintName: 'build_night_holds_booking' })
  booking: Relation<Booking> | null;

  @Column('uuid')
  madeById: string;

  @ManyToOne(() => Person, { nullable: false })
  @JoinColumn({ name: 'made_by_id', foreignKeyConstraintName: 'build_night_made_by_person' })
  madeBy: Relation<Person>;

  @Column('timestamptz')
  madeAt: Date;

  @Column('timestamptz', { nullable: true })
  cancelledAt: Date | null;

  /** The word that went to everybody who was coming. */
  @Column('text', { nullable: true })
  cancelledReason: string | null;
}
