import {
  Check,
  Column,
  Entity,
  Exclusion,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import { Resource } from '../instruments/resource.entity';
import { Booking } from './booking.entity';

/**
 * One bench or instrument of a booking. That no two overlap is the database's own rule, whoever writes; so the times of
 * the booking, and whether it holds, are repeated here and follow it by the foreign key.
 */
@Entity()
@Check('booking_item_times_ordered', `starts_at < ends_at`)
@Exclusion(
  'booking_no_overlap',
  `USING gist ("resource_id" WITH =, tstzrange("starts_at", "ends_at", '[)') WITH &&) WHERE ("holds")`,
)
export class BookingItem {
  @PrimaryColumn('uuid')
  bookingId: string;

  @ManyToOne(() => Booking, { nullable: false, onDelete: 'CASCADE', onUpdate: 'CASCADE' })
  @JoinColumn([
    { name: 'booking_id', referencedColumnName: 'id', foreignKeyConstraintName: 'booking_item_as_booked' },
    { name: 'starts_at', referencedColumnName: 'startsAt' },
    { name: 'ends_at', referencedColumnName: 'endsAt' },
    { name: 'holds', referencedColumnName: 'holds' },
  ])
  booking: Relation<Booking>;

  @PrimaryColumn('uuid')
  resourceId: string;

  @ManyToOne(() => Resource, { nullable: false })
  @JoinColumn({ name: 'resource_id', foreignKeyConstraintName: 'booking_item_resource_exists' })
  resource: Relation<Resource>;

  @Column('timestamptz')
  startsAt: Date;

  @Column('timestamptz')
  endsAt: Date;

  @Column('boolean', { default: true })
  holds: boolean;
}
