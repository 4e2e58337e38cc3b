import { Check, Column, Entity, PrimaryColumn } from 'typeorm';

/** The one club of this database: a single row, so that its settings have one place. */
@Entity()
@Check('club_only_one', `id = 1`)
@Check('club_currency_code', `currency ~ '^[A-Z]{3}$'`)
export class Club {
  @PrimaryColumn('integer', { default: 1 })
  id: number;

  @Column('text')
  name: string;

  /** Where it meets, one line. */
  @Column('text', { default: '' })
  address: string;

  @Column('text', { default: '' })
  contactEmail: string;

  /** An IANA zone: the clock on the club's wall. */
  @Column('text')
  timeZone: string;

  /** ISO 4217. All amounts of the club are in its minor unit. */
  @Column('text')
  currency: string;

  /** For transfers, as members type them: `00-41-17 3006 4417`. */
  @Column('text', { default: '' })
  accountNumber: string;

  @Column('text', { default: '' })
  accountName: string;
}
