import { Check, Column, Entity, PrimaryColumn } from 'typeorm';

/** The rule sets an organiser may choose among. */
export const CLUB_RULE_SETS = ['US-97', 'IARU-R1'] as const;
export type ClubRuleSet = (typeof CLUB_RULE_SETS)[number];

/** The one club of this database: a single row, so that its settings have one place. */
@Entity()
@Check('club_only_one', `id = 1`)
@Check('club_rule_set_known', `rule_set IN ('US-97', 'IARU-R1')`)
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

  /** By which rules the calculators judge what may be sent: their id in the levels package. */
  @Column('text', { default: 'IARU-R1' })
  ruleSet: ClubRuleSet;

  /** ISO 4217. All amounts of the club are in its minor unit. */
  @Column('text')
  currency: string;

  /** For transfers, as members type them: `00-41-17 3006 4417`. */
  @Column('text', { default: '' })
  accountNumber: string;

  @Column('text', { default: '' })
  accountName: string;
}
