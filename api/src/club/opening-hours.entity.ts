import { Check, Column, Entity, PrimaryColumn } from 'typeorm';

/** When somebody opens the workshop on a day of the week, by the club's wall. A day without a row is closed. */
@Entity()
@Check('opening_hours_weekday_known', `weekday BETWEEN 1 AND 7`)
@Check(
  'opening_hours_in_order',
  `opens_minute >= 0 AND opens_minute < closes_minute AND closes_minute <= 1440`,
)
export class OpeningHours {
  /** ISO 8601: Monday is 1, Sunday 7. */
  @PrimaryColumn('smallint')
  weekday: number;

  /** Since midnight on the wall. */
  @Column('smallint')
  opensMinute: number;

  /** 1440 is midnight at the end of the day. */
  @Column('smallint')
  closesMinute: number;
}
